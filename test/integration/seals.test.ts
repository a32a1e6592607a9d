import { createHash } from 'node:crypto';
import type { Seal } from '@weighhouse/shared/contracts/rounds';
import { sealHolds } from '@weighhouse/shared/seals/seal';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  acceptedCase,
  castOf,
  handIn,
  judge,
  type JudgedCase,
  openRound,
  savePrior,
  saveRow,
  seat,
  type SeatedPerson,
  unseal,
  unsealedCase,
} from '../factories/judgements.js';
import { type RunningApp, startApp } from '../setup/app.js';

let running: RunningApp;
beforeAll(async () => {
  running = await startApp();
  await castOf(running);
});
afterAll(() => running.close());

const sealsFor = async (case_: JudgedCase, person: SeatedPerson): Promise<Seal[]> =>
  ((await person.agent.get(`/api/cases/${case_.id}/seals`).expect(200)).body as { items: Seal[] }).items;

/**
 * RFC 8785 for what a sealed document holds (objects, arrays, ASCII strings, integers, null): keys sorted by UTF-16
 * code units, no white space. Written here on its own, so that it does not lean on the code that it checks.
 */
function canonical(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(canonical).join(',')}]`;
  if (typeof value !== 'object' || value === null) return JSON.stringify(value);
  const entries = Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1));
  return `{${entries.map(([key, part]) => `${JSON.stringify(key)}:${canonical(part)}`).join(',')}}`;
}

/** SHA-256 (FIPS 180-4) of the random bytes followed by the canonical text. */
const digestOf = (random: string, document: unknown): string =>
  createHash('sha256').update(Buffer.from(random, 'hex')).update(canonical(document), 'utf8').digest('hex');

describe('a seal', () => {
  it('shows its digest to the team at hand-in and what proves it only after unsealing', async () => {
    const case_ = await acceptedCase(running);
    const round = await openRound(case_, 'sealed');
    const digests: string[] = [];
    for (const [k, person] of case_.contributors.entries()) {
      await judge(case_, person, k as 0 | 1 | 2);
      digests.push(await handIn(round, person));
    }
    for (const person of [case_.referrer, case_.chair, ...case_.contributors]) {
      const seals = await sealsFor(case_, person);
      expect(seals.map((seal) => seal.digest)).toEqual(digests);
      expect(seals.map((seal) => [seal.random, seal.document])).toEqual(digests.map(() => [null, null]));
      expect(seals.map((seal) => seal.person.id)).toEqual(case_.contributors.map((one) => one.id));
    }
    await unseal(case_, round);
    for (const person of [case_.chair, ...case_.contributors]) {
      const seals = await sealsFor(case_, person);
      expect(seals.map((seal) => seal.digest)).toEqual(digests);
      for (const { random, document, digest } of seals) {
        expect(random).toMatch(/^[0-9a-f]{64}$/);
        expect(digestOf(random ?? '', document)).toBe(digest);
        expect(document && (await sealHolds({ random: random ?? '', document, digest }))).toBe(true);
      }
      expect(new Set(seals.map((seal) => seal.random)).size).toBe(3);
    }
    const [forReferrer] = await sealsFor(case_, case_.referrer);
    expect(forReferrer).toMatchObject({ digest: digests[0], random: null, document: null });
  });

  it('closes over the judgement that was handed in, in thousandths', async () => {
    const case_ = await unsealedCase(running);
    const [seal] = await sealsFor(case_, case_.chair);
    const [person] = case_.contributors;
    expect(seal?.document).toEqual({
      caseId: case_.id,
      roundId: case_.round.id,
      personId: person?.id,
      candidateSet: case_.round.candidateSet,
      findings: case_.findings.map((finding) => finding.id),
      judgement: {
        prior: [317, 236, 447],
        rows: [
          { finding: case_.findings[0]?.id, exposure: 'often', given: [713, 489, 119] },
          { finding: case_.findings[1]?.id, exposure: 'often', given: [687, 93, 211] },
        ],
      },
    });
  });

  it('does not hold for a judgement with one thousandth changed, other random bytes or another person', async () => {
    const case_ = await unsealedCase(running);
    const [first, second] = await sealsFor(case_, case_.chair);
    if (!first?.document || !second?.random || first.random === null) throw new Error('two seals are needed');
    const { document, random, digest } = first;
    const changed = structuredClone(document);
    changed.judgement.prior = [318, 235, 447];
    expect(digestOf(random, changed)).not.toBe(digest);
    expect(await sealHolds({ random, document: changed, digest })).toBe(false);
    expect(await sealHolds({ random: second.random, document, digest })).toBe(false);
    const another = { ...document, personId: second.person.id };
    expect(await sealHolds({ random, document: another, digest })).toBe(false);
  });

  it('stays what it was when its giver judges on, and a live round’s seals are open at once', async () => {
    const case_ = await unsealedCase(running);
    const before = await sealsFor(case_, case_.chair);
    const live = await openRound(case_, 'live');
    const [person] = case_.contributors;
    if (!person) throw new Error('a contributor is needed');
    await savePrior(case_, person, [60, 20, 20]);
    await saveRow(case_, person, 2, [[10, 20, 70], null, null]);
    const digest = await handIn(live, person);
    const after = await sealsFor(case_, case_.chair);
    expect(after.slice(0, 3)).toEqual(before);
    expect(after[3]).toMatchObject({ roundNumber: 2, digest });
    expect(digestOf(after[3]?.random ?? '', after[3]?.document)).toBe(digest);
    expect(after[3]?.document?.judgement).toMatchObject({
      prior: [600, 200, 200],
      rows: [{}, {}, { given: [[100, 200, 700], null, null] }],
    });
  });

  it('is not shown to liaisons and strangers', async () => {
    const case_ = await unsealedCase(running);
    await case_.liaison.agent.get(`/api/cases/${case_.id}/seals`).expect(403);
    const stranger = await seat(running, ['chair', 'specialist', 'administrator']);
    await stranger.agent.get(`/api/cases/${case_.id}/seals`).expect(404);
    await running.agent().get(`/api/cases/${case_.id}/seals`).expect(401);
  });
});
