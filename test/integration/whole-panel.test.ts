import { execFile } from 'node:child_process';
import path from 'node:path';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import type { Seal } from '@weighhouse/shared/contracts/rounds';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
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
} from '../factories/judgements.js';
import { type RunningApp, startApp } from '../setup/app.js';

const levels = (count: number): string[] => Array.from({ length: count }, (_, k) => `level ${String(k + 1)}`);
const findings = [
  { title: 'Fever', observed: 1 },
  { title: 'Ferritin', observed: 2, levelLabels: levels(3), reliability: 'fair' },
  { title: 'Grade', observed: 0, levelLabels: levels(6) },
  { title: 'Gait', observed: 3, levelLabels: levels(5), reliability: 0.4 },
  { title: 'Marrow', observed: null, levelLabels: levels(4), cost: 1400, waitDays: 6, burden: 2 },
  { title: 'Swab', observed: null, cost: 12.5, waitDays: 0.5, burden: 0 },
];
/** For each row what one person gives in each column: a number, a share for each level, or nothing. */
const rowsOf = (shift: number): unknown[][] => [
  [71.3 + shift, 48.9, 11.9],
  [[10.1, 20.2, 69.7], null, [50, 30, 20]],
  [
    [50, 10, 10, 10, 10, 10],
    [5, 5, 20, 20, 25, 25],
    [20, 20, 20, 20, 10, 10],
  ],
  [[20, 20, 20, 20, 20], [10 + shift, 30 - shift, 20, 20, 20], null],
  [
    [70.5, 9.5, 10, 10],
    [10, 20, 30, 40],
    [25, 25, 25, 25],
  ],
  [33.3, null, 66.6],
];

let running: RunningApp;
let case_: JudgedCase;
let ann: SeatedPerson;
let ben: SeatedPerson;

beforeAll(async () => {
  running = await startApp();
  case_ = await acceptedCase(running, { contributors: 2, quorum: 2, weights: [2, 0.5], findings });
  [ann, ben] = case_.contributors as [SeatedPerson, SeatedPerson];
  const [a = '', b = ''] = case_.candidateIds;
  const settings = {
    coexistence: 0.1,
    tempering: 0.8,
    groups: [{ label: 'Inflammation', overlap: 0.33, reason: 'one mechanism' }],
    together: [{ a, b, times: 3, reason: 'the one leads to the other' }],
    reason: 'agreed at the first meeting',
  };
  const { body } = await case_.chair.agent
    .patch(`/api/cases/${case_.id}/settings`)
    .send(settings)
    .expect(200);
  const groupId = (body as { groups: { id: string }[] }).groups[0]?.id;
  for (const finding of case_.findings.slice(0, 2)) {
    const change = { version: finding.version, groupId };
    await case_.chair.agent.patch(`/api/findings/${finding.id}`).send(change).expect(200);
  }
  const round = await openRound(case_, 'sealed');
  for (const [k, person] of [ann, ben].entries()) {
    await savePrior(case_, person, [40 + k, 35.5, 24.5 - k]);
    for (const [r, row] of rowsOf(k).entries())
      await saveRow(case_, person, r, row, { exposure: k === 0 ? 'often' : 'seldom', reason: 'seen before' });
    await handIn(round, person);
  }
  await unseal(case_, round);
});
afterAll(() => running.close());

const panelFor = async (person: SeatedPerson): Promise<PanelView> =>
  (await person.agent.get(`/api/cases/${case_.id}/panel`).expect(200)).body as PanelView;

/** What the command of the project prints for a panel. */
function assessedByCommand(panel: PanelView): Promise<unknown> {
  return new Promise((resolve, reject) => {
    const root = path.resolve(import.meta.dirname, '../..');
    const command = execFile('npm', ['run', '--silent', 'assess'], { cwd: root }, (error, stdout, stderr) => {
      if (error) reject(new Error(`${stdout}${stderr}`, { cause: error }));
      else resolve(JSON.parse(stdout));
    });
    command.stdin?.end(JSON.stringify(panel));
  });
}

/** Every number of an answer by its place, and everything else as it is. */
function flat(value: unknown, place = ''): [string, unknown][] {
  if (typeof value !== 'object' || value === null) return [[place, value]];
  return Object.entries(value).flatMap(([key, part]) => flat(part, `${place}.${key}`));
}

describe('a panel with everything that the method takes', () => {
  it('goes from the screen to the panel as it was given', async () => {
    const panel = await panelFor(ann);
    const group = panel.groups[0]?.id;
    expect(panel).toMatchObject({
      candidates: case_.candidateIds,
      coexistence: 0.1,
      tempering: 0.8,
      together: [{ a: 0, b: 1, times: 3 }],
      groups: [{ overlap: 0.33 }],
    });
    expect(panel.findings.map(({ id: _, ...finding }) => finding)).toEqual([
      { levels: 2, observed: 1, reliability: 1, group },
      { levels: 3, observed: 2, reliability: 0.7, group },
      { levels: 6, observed: 0, reliability: 1 },
      { levels: 5, observed: 3, reliability: 0.4 },
      { levels: 4, observed: null, reliability: 1, cost: 1400, waitDays: 6, burden: 2 },
      { levels: 2, observed: null, reliability: 1, cost: 12.5, waitDays: 0.5, burden: 0 },
    ]);
    const anns = panel.contributors.find(({ id }) => id === ann.id);
    expect(anns).toMatchObject({ weight: 2, prior: [0.4, 0.355, 0.245] });
    const given = (r: number) => anns?.likelihoods[case_.findings[r]?.id ?? ''];
    expect(given(0)).toEqual({ exposure: 'often', given: [0.713, 0.489, 0.119] });
    expect(given(1)?.given).toEqual([[0.101, 0.202, 0.697], null, [0.5, 0.3, 0.2]]);
    expect(given(2)?.given[1]).toEqual([0.05, 0.05, 0.2, 0.2, 0.25, 0.25]);
    expect(given(4)?.given[0]).toEqual([0.705, 0.095, 0.1, 0.1]);
    expect(given(5)?.given).toEqual([0.333, null, 0.666]);
  });

  it('comes back to its giver in the form in which it was given, and to the others after unsealing', async () => {
    const { mine } = await readDifferential(case_, ann);
    const { others } = await readDifferential(case_, ben);
    for (const saved of [mine?.findings, others?.find(({ personId }) => personId === ann.id)?.findings]) {
      const rows = case_.findings.map(({ id }) => saved?.find(({ findingId }) => findingId === id)?.outOf100);
      expect(rows).toEqual(rowsOf(0));
    }
  });

  it('is sealed in thousandths, level by level', async () => {
    const { body } = await ben.agent.get(`/api/cases/${case_.id}/seals`).expect(200);
    const seal = (body.items as Seal[]).find(({ person }) => person.id === ann.id);
    const rows = seal?.document?.judgement.rows ?? [];
    expect(seal?.document?.judgement.prior).toEqual([400, 355, 245]);
    const givenTo = (r: number) => rows.find(({ finding }) => finding === case_.findings[r]?.id)?.given;
    expect(givenTo(0)).toEqual([713, 489, 119]);
    expect(givenTo(1)).toEqual([[101, 202, 697], null, [500, 300, 200]]);
    expect(givenTo(4)).toEqual([
      [705, 95, 100, 100],
      [100, 200, 300, 400],
      [250, 250, 250, 250],
    ]);
  });

  it('refuses shares for the wrong number of levels, and a sum that is not 100', async () => {
    await openRound(case_, 'live');
    const { candidateSet } = await readDifferential(case_, ann);
    const save = (finding: Finding | undefined, outOf100: unknown[]) =>
      ann.agent
        .put(`/api/cases/${case_.id}/judgement/findings/${finding?.id ?? ''}`)
        .send({ candidateSet, exposure: 'often', outOf100 });
    await save(case_.findings[1], [[50, 50], null, null]).expect(400);
    await save(case_.findings[1], [[50, 30, 10], null, null]).expect(400);
    await save(case_.findings[1], [50, null, null]).expect(400);
    await save(case_.findings[2], [[100, 0, 0, 0, 0, 0], null, null]).expect(400);
  });

  it('is what the command takes, and the command says what the server serves', async () => {
    for (const person of [case_.chair, case_.referrer]) {
      const panel = await panelFor(person);
      const { assessment } = await readDifferential(case_, person);
      const served = new Map(flat(assessment));
      const printed = flat(await assessedByCommand(panel));
      expect(printed.length).toBe(served.size);
      expect(printed.length).toBeGreaterThan(150);
      for (const [place, value] of printed) {
        if (typeof value !== 'number') expect([place, served.get(place)]).toEqual([place, value]);
        else expect(Math.abs(value - Number(served.get(place))), place).toBeLessThanOrEqual(1e-12);
      }
      const file = await person.agent
        .get(`/api/cases/${case_.id}/export?format=panel`)
        .buffer(true)
        .expect(200);
      expect(file.body).toEqual(panel);
    }
    const { assessment } = await readDifferential(case_, ann);
    expect(assessment?.sets.some(({ members }) => members.length === 2)).toBe(true);
    expect(assessment?.nextTests.map(({ levels: results }) => results.length).sort()).toEqual([2, 4]);
  });
});
