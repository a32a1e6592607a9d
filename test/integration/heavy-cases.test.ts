import { Assessor } from '@weighhouse/server/differential/assessing/assessor';
import type { Asked } from '@weighhouse/server/differential/assessing/computations';
import { heavyMs, costMs } from '@weighhouse/server/differential/assessing/cost';
import type { Differential, PanelView } from '@weighhouse/shared/contracts/differential';
import { liveEvents } from '@weighhouse/shared/contracts/live';
import { assess } from '@weighhouse/shared/reasoning/assess';
import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import {
  acceptedCase,
  handIn,
  type JudgedCase,
  openRound,
  readDifferential,
  savePrior,
  saveRow,
  type SeatedPerson,
  unseal,
  unsealedCase,
} from '../factories/judgements.js';
import { closeListeners, listen, type Listener } from '../factories/live.js';
import { type RunningApp, serviceOf, startApp } from '../setup/app.js';

const heavyShape = { candidates: 16, findings: 60, contributors: 12 };
const rowsEach = heavyShape.findings / heavyShape.contributors;

let running: RunningApp;
let heavy: JudgedCase;
let light: JudgedCase;

/** Every question that is asked of the method, in order. */
function watchedAssessor() {
  const asked: { asked: Asked; panel: PanelView }[] = [];
  const assessor = serviceOf(running.app, Assessor);
  const ask = assessor.ask.bind(assessor);
  vi.spyOn(assessor, 'ask').mockImplementation((what, panel) => {
    asked.push({ asked: what, panel });
    return ask(what, panel);
  });
  return asked;
}

/** Twelve people judge five of the sixty rows each. */
async function heavyCase(): Promise<JudgedCase> {
  const case_ = await acceptedCase(running, {
    contributors: heavyShape.contributors,
    candidates: Array.from({ length: heavyShape.candidates }, (_, k) => `Candidate ${String(k + 1)}`),
    findings: Array.from({ length: heavyShape.findings }, (_, r) => ({
      title: `Finding ${String(r + 1)}`,
      observed: r % 6 === 0 ? null : r % 2,
    })),
  });
  const round = await openRound(case_, 'sealed');
  const { candidateSet } = await readDifferential(case_, case_.chair);
  await Promise.all(
    case_.contributors.map(async (person, j) => {
      const shares = Array.from({ length: 17 }, (_, k) => 5 + ((j + k) % 3));
      const rest = shares.slice(1).reduce((sum, share) => sum + share, 0);
      const judgement = `/api/cases/${case_.id}/judgement`;
      const save = (target: string, outOf100: number[], more: object = {}) =>
        person.agent
          .put(`${judgement}/${target}`)
          .send({ candidateSet, outOf100, ...more })
          .expect(200);
      await save('prior', [100 - rest, ...shares.slice(1)]);
      for (let n = 0; n < rowsEach; n += 1) {
        const r = j * rowsEach + n;
        const cells = shares.map((_, k) => 5 + ((7 * j + 13 * r + 29 * k) % 90));
        await save(`findings/${case_.findings[r]?.id ?? ''}`, cells, { exposure: 'often' });
      }
      await handIn(round, person, { noMore: true });
    }),
  );
  await unseal(case_, round);
  const settings = { coexistence: 0.05, reason: 'several at once are common here' };
  await case_.chair.agent.patch(`/api/cases/${case_.id}/settings`).send(settings).expect(200);
  await openRound(case_, 'live');
  return case_;
}

beforeAll(async () => {
  running = await startApp();
  heavy = await heavyCase();
  light = await unsealedCase(running);
  await openRound(light, 'live');
}, 300_000);
afterEach(() => {
  vi.restoreAllMocks();
  closeListeners();
});
afterAll(() => running.close());

const plain = (value: unknown): unknown => JSON.parse(JSON.stringify(value));
const panelFor = async (case_: JudgedCase, person: SeatedPerson): Promise<PanelView> =>
  (await person.agent.get(`/api/cases/${case_.id}/panel`).expect(200)).body as PanelView;
const firstOf = (case_: JudgedCase): SeatedPerson => case_.contributors[0] ?? case_.chair;

/** What pages heard, in the order in which it came to this process. */
function heardInOrder(pages: Record<string, Listener>): string[] {
  const order: string[] = [];
  for (const [name, page] of Object.entries(pages))
    page.socket.onAny((event: string) => {
      if (event !== liveEvents.present) order.push(`${name} ${event}`);
    });
  return order;
}

describe('a heavy case', () => {
  it('pushes its standing at once and the rest after it, and holds up no other case meanwhile', async () => {
    expect(costMs(await panelFor(heavy, heavy.chair), 'whole')).toBeGreaterThan(heavyMs);
    const pages = {
      heavy: await listen(running, heavy.chair, heavy.id),
      light: await listen(running, light.chair, light.id),
    };
    const order = heardInOrder(pages);
    await saveRow(
      heavy,
      firstOf(heavy),
      1,
      Array.from({ length: 17 }, (_, k) => 20 + k),
    );
    await pages.heavy.until(liveEvents.standing);
    await savePrior(light, firstOf(light), [60, 30, 10]);
    const told = await pages.heavy.until(liveEvents.assessment);
    expect(order.filter((event) => event !== 'light case.changed' && event !== 'heavy case.changed')).toEqual(
      ['heavy case.standing', 'light case.standing', 'heavy case.assessment'],
    );
    const { assessment, revision } = await readDifferential(heavy, heavy.chair);
    expect(told).toMatchObject({ caseId: heavy.id, revision });
    expect(told.assessment).toEqual(assessment);
    expect(plain(assess(await panelFor(heavy, heavy.chair)))).toEqual(assessment);
    expect(pages.heavy.of(liveEvents.standing).at(-1)?.standing).toEqual(assessment?.standing);
    // What takes little is fetched with the change and not pushed a second time.
    expect(pages.light.of(liveEvents.assessment)).toEqual([]);
  });

  it('is computed once for everybody who asks, whoever may see whose numbers they are', async () => {
    const page = await listen(running, heavy.referrer, heavy.id);
    await saveRow(
      heavy,
      firstOf(heavy),
      2,
      Array.from({ length: 17 }, (_, k) => 30 + k),
    );
    const asked = watchedAssessor();
    await page.until(liveEvents.standing);
    const people = [heavy.chair, heavy.referrer, ...heavy.contributors.slice(0, 3)];
    const seen = await Promise.all(people.map((person) => readDifferential(heavy, person)));
    const told = await page.until(liveEvents.assessment);
    expect(asked.filter((one) => one.asked === 'whole').length).toBeLessThanOrEqual(1);
    const [chairs, referrers] = seen as [Differential, Differential];
    expect(new Set(seen.map(({ assessment }) => JSON.stringify(assessment?.standing))).size).toBe(1);
    expect(Object.keys(chairs.assessment?.own ?? {}).sort()).toEqual(
      heavy.contributors.map(({ id }) => id).sort(),
    );
    // The referrer's copy names nobody, pushed or fetched.
    expect(told.assessment).toEqual(referrers.assessment);
    for (const { id } of heavy.contributors) expect(JSON.stringify(told)).not.toContain(id);
    expect(referrers.assessment?.linearPool).toEqual(chairs.assessment?.linearPool);
    expect(plain(assess(await panelFor(heavy, heavy.referrer)))).toEqual(referrers.assessment);
  });

  it('sends its assessment to nobody once a sealed round is open', async () => {
    const page = await listen(running, heavy.chair, heavy.id);
    const { body } = await heavy.chair.agent.get(`/api/cases/${heavy.id}/rounds`).expect(200);
    const open = (body.items as { id: string; state: string }[]).find(({ state }) => state === 'open');
    await saveRow(
      heavy,
      firstOf(heavy),
      3,
      Array.from({ length: 17 }, (_, k) => 40 + k),
    );
    await heavy.chair.agent
      .post(`/api/rounds/${open?.id ?? ''}/close`)
      .send({})
      .expect(200);
    await openRound(heavy, 'sealed');
    page.heard.length = 0;
    // Everything that was under way has been computed when this is answered.
    await readDifferential(heavy, heavy.chair);
    await readDifferential(heavy, heavy.referrer);
    expect(page.of(liveEvents.assessment)).toEqual([]);
    expect(page.of(liveEvents.standing)).toEqual([]);
  });
});

describe('of a sealed round', () => {
  /** Only a panel of one person alone carries this key. */
  const isOwn = ({ contributors }: PanelView): boolean =>
    contributors.length === 1 && contributors[0]?.id === 'own';

  it('nothing is computed but where one stands alone, for oneself', async () => {
    const case_ = await acceptedCase(running);
    const round = await openRound(case_, 'sealed');
    const asked = watchedAssessor();
    const [ann, ben] = case_.contributors as [SeatedPerson, SeatedPerson];
    await savePrior(case_, ann, [31.7, 23.6, 44.7]);
    await saveRow(case_, ann, 0, [71.3, 48.9, 11.9]);
    await handIn(round, ann, { noMore: true });
    await saveRow(case_, ben, 1, [83.1, 37.7, 14.3]);
    for (const person of [case_.chair, case_.referrer, ann, ben]) await readDifferential(case_, person);
    for (const { agent } of [case_.chair, ann]) {
      await agent.get('/api/cases?size=100').expect(200);
      await agent.get('/api/today').expect(200);
    }
    await case_.chair.agent.get(`/api/cases/${case_.id}/panel`).expect(403);
    await case_.chair.agent
      .post(`/api/cases/${case_.id}/findings`)
      .send({ title: 'Sore throat', observed: 1 })
      .expect(201);
    expect(asked.length).toBeGreaterThan(0);
    expect(asked.every((one) => one.asked === 'standing' && isOwn(one.panel))).toBe(true);
  });

  it('after an earlier one the pool stays made of what was unsealed', async () => {
    const case_ = await unsealedCase(running);
    const before = (await panelFor(case_, case_.chair)).contributors;
    await openRound(case_, 'sealed');
    const asked = watchedAssessor();
    const ann = firstOf(case_);
    await savePrior(case_, ann, [59.7, 22.9, 17.4]);
    await saveRow(case_, ann, 0, [97.9, 3.7, 52.3]);
    await case_.chair.agent
      .post(`/api/cases/${case_.id}/findings`)
      .send({ title: 'Sore throat', observed: 1 })
      .expect(201);
    for (const person of [case_.chair, case_.referrer, ann]) await readDifferential(case_, person);
    const pooled = asked.filter(({ panel }) => !isOwn(panel));
    expect(pooled.length).toBeGreaterThan(0);
    for (const { panel } of pooled) expect(panel.contributors).toEqual(before);
    expect(asked.some(({ panel }) => JSON.stringify(panel).includes('0.597'))).toBe(true);
    expect(JSON.stringify(pooled)).not.toContain('0.597');
    expect(JSON.stringify(pooled)).not.toContain('0.979');
  });
});

describe('the end of the server', () => {
  it('leaves no thread at work and nobody waiting', async () => {
    const panel = await panelFor(heavy, heavy.chair);
    const assessor = serviceOf(running.app, Assessor);
    const answers = Promise.allSettled([assessor.ask('whole', panel), assessor.ask('whole', panel)]);
    await assessor.onApplicationShutdown();
    expect((await answers).map(({ status }) => status)).toEqual(['rejected', 'rejected']);
    await expect(assessor.ask('whole', panel)).rejects.toThrow('closing');
  });
});
