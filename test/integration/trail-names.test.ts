import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { TrailEntry } from '@weighhouse/shared/contracts/trail';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  type JudgedCase,
  judge,
  openRound,
  readDifferential,
  saveRow,
  type SeatedPerson,
  teamOf,
  unsealedCase,
} from '../factories/judgements.js';
import { type RunningApp, startApp } from '../setup/app.js';

let running: RunningApp;
let case_: JudgedCase;

beforeAll(async () => {
  running = await startApp();
  case_ = await unsealedCase(running);
  await openRound(case_, 'live');
});
afterAll(() => running.close());

const trail = async ({ agent }: SeatedPerson): Promise<TrailEntry[]> => {
  const { body } = await agent.get(`/api/cases/${case_.id}/trail`).query({ size: '200' }).expect(200);
  return (body as { items: TrailEntry[] }).items;
};
const actions = async (person: SeatedPerson): Promise<string[]> =>
  (await trail(person)).map(({ action }) => action);

/** The referrer sees everybody's numbers without names, so nothing beside them may say whose they are. */
describe('the trail of a referrer', () => {
  it('does not name who saved, neither beside numbers that move nor by how many lines somebody has', async () => {
    const [ann, ben] = case_.contributors;
    if (!ann || !ben) throw new Error('two contributors are needed');
    const before: Differential = await readDifferential(case_, case_.referrer);
    expect(before.others).toHaveLength(3);
    const lines = await trail(case_.referrer);
    await saveRow(case_, ann, 0, [44.4, 33.3, 22.2]);
    await judge(case_, ben, 2);
    const after = await readDifferential(case_, case_.referrer);
    expect(after.others).not.toEqual(before.others);
    expect(await trail(case_.referrer)).toEqual(lines);
    expect(lines.some(({ action }) => action === 'judgement.saved')).toBe(false);
    expect(await actions(case_.chair)).toContain('judgement.saved');
    expect(await actions(ann)).toContain('judgement.saved');
  });

  it('does not name whose weight was changed; the chair’s does', async () => {
    const lines = await trail(case_.referrer);
    await case_.chair.agent
      .put(`/api/cases/${case_.id}/team`)
      .send(teamOf(case_, [0.5]))
      .expect(200);
    expect(await actions(case_.chair)).toContain('team.weighed');
    expect(await trail(case_.referrer)).toEqual(lines);
  });

  it('still tells who opened, unsealed and handed in', async () => {
    expect(new Set(await actions(case_.referrer))).toEqual(
      new Set([
        'case.opened',
        'case.submitted',
        'case.accepted',
        'team.joined',
        'candidate.added',
        'finding.added',
        'round.opened',
        'round.handedIn',
        'round.unsealed',
      ]),
    );
  });
});
