import type { Round, Seal, SealedDocument } from '@weighhouse/shared/contracts/rounds';
import { sealDigest, toHex } from '@weighhouse/shared/seals/seal';
import { describe, expect, it } from 'vitest';
import { checkSeals } from './check-seals';
import { seenDigest, withSeen } from './seen-digests';

const random = Uint8Array.from({ length: 32 }, (_, index) => index * 7);
const document: SealedDocument = {
  caseId: 'case',
  roundId: 'round',
  personId: 'person',
  candidateSet: 1,
  findings: ['f1'],
  judgement: { prior: [300, 700], rows: [{ finding: 'f1', exposure: 'often', given: [650, null] }] },
};

async function makeSeal(parts: Partial<Seal> = {}): Promise<Seal> {
  return {
    roundId: 'round',
    roundNumber: 1,
    person: { id: 'person', name: 'Dr A', specialty: '', centre: '' },
    handedInAt: '2026-12-01T09:00:00.000Z',
    digest: await sealDigest(random, document),
    random: toHex(random),
    document,
    ...parts,
  };
}

const verdict = async (parts: Partial<Seal>) => (await checkSeals([await makeSeal(parts)], {}))[0]?.verdict;

describe('checking seals', () => {
  it('holds for what was sealed', async () => {
    expect(await verdict({})).toBe('holds');
  });

  it('is broken by any changed number, byte or name', async () => {
    const changed = { ...document, judgement: { ...document.judgement, prior: [301, 699] } };
    expect(await verdict({ document: changed })).toBe('broken');
    expect(await verdict({ random: toHex(random.map((byte) => byte ^ 1)) })).toBe('broken');
    expect(await verdict({ random: 'not hexadecimal' })).toBe('broken');
    expect(await verdict({ random: 'ff' })).toBe('broken');
  });

  it('is broken where it closes over another person or round, although its digest is right', async () => {
    const other = { ...document, personId: 'another' };
    expect(await verdict({ document: other, digest: await sealDigest(random, other) })).toBe('broken');
    const old = { ...document, roundId: 'earlier' };
    expect(await verdict({ document: old, digest: await sealDigest(random, old) })).toBe('broken');
  });

  it('has nothing to check before the unsealing', async () => {
    expect(await verdict({ random: null, document: null })).toBe('closed');
  });

  it('tells a digest that was exchanged between hand-in and unsealing', async () => {
    const seal = await makeSeal();
    const seen = (digest: string) => ({ 'round person': { digest, at: '2026-12-01T09:00:00.000Z' } });
    const compare = async (memory: Parameters<typeof checkSeals>[1]) =>
      (await checkSeals([seal], memory))[0]?.seen;
    expect(await compare(seen(seal.digest.toUpperCase()))).toBe('same');
    expect(await compare(seen('0'.repeat(64)))).toBe('other');
    expect(await compare({})).toBe('never');
  });
});

describe('the digests seen', () => {
  const member = (id: string, digest: string | null) => ({
    person: { id, name: id, specialty: '', centre: '' },
    handedInAt: null,
    digest,
  });
  const round: Round = {
    id: 'round',
    number: 1,
    kind: 'sealed',
    state: 'open',
    candidateSet: 1,
    openedAt: '2026-12-01T09:00:00.000Z',
    deadline: null,
    unsealedAt: null,
    unsealReason: null,
    closedAt: null,
    members: [member('a', 'one'), member('b', null)],
  };

  it('are kept from the first time, never replaced', () => {
    const first = withSeen({}, round, 'then');
    const later = withSeen(first, { ...round, members: [member('a', 'another'), member('b', 'two')] }, 'now');
    expect(seenDigest(later, 'round', 'a')).toEqual({ digest: 'one', at: 'then' });
    expect(seenDigest(later, 'round', 'b')).toEqual({ digest: 'two', at: 'now' });
  });

  it('come from a round that is still sealed alone', () => {
    expect(withSeen({}, { ...round, state: 'unsealed' }, 'now')).toEqual({});
    expect(seenDigest({}, '__proto__', '')).toBeNull();
  });
});
