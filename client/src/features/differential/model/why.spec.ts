import { describe, expect, it } from 'vitest';
import { makeDifferential, makeFinding, makeMine, makeOther, makeRow } from '../testing/make-differential';
import { whyCell, whyPrior } from './why';

const fever = makeFinding({ id: 'fever' });
const prior = {
  candidateSet: 1,
  version: 1,
  outOf100: [20, 80],
  reason: 'why',
  savedAt: '2026-12-01T09:00:00.000Z',
};
const differential = makeDifferential({
  findings: [fever],
  mine: makeMine({
    findings: [{ ...makeRow('fever', [65, null]), exposure: 'sometimes' }],
    prior,
    priorInForce: false,
  }),
  others: [
    makeOther('blank', { weight: 2 }),
    makeOther('dr', {
      weight: 2,
      findings: [{ ...makeRow('fever', [40, 10]), exposure: 'seldom' }],
      prior,
      priorInForce: true,
    }),
  ],
});
const weightOf = (voice: { you: boolean; weight: number | null }) => (voice.you ? 1 : voice.weight);

describe('why a cell has its number', () => {
  it('names everybody, their number, and weight times exposure, those who left it blank last', () => {
    const lines = whyCell(differential, fever, 0, weightOf);
    expect(lines.map((line) => [line.voice.key, line.share, line.counts])).toEqual([
      ['me', 0.65, 0.5],
      ['dr', 0.4, 0.5],
      ['blank', null, null],
    ]);
  });

  it('shows for an absent finding how many would not show it', () => {
    expect(whyCell(differential, { ...fever, observed: 0 }, 0, weightOf)[1]?.share).toBeCloseTo(0.6, 12);
  });

  it('leaves out a prior of an earlier candidate set', () => {
    const lines = whyPrior(differential, 0, weightOf);
    expect(lines.map((line) => [line.voice.key, line.share, line.reason])).toEqual([
      ['dr', 0.2, 'why'],
      ['me', null, null],
      ['blank', null, null],
    ]);
  });
});
