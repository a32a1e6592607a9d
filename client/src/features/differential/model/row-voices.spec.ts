import { describe, expect, it } from 'vitest';
import { makeDifferential, makeFinding, makeMine, makeOther, makeRow } from '../testing/make-differential';
import { rowVoices } from './row-voices';

const murmur = makeFinding({ id: 'murmur', observed: 0 });
const differential = makeDifferential({
  findings: [murmur],
  mine: makeMine({ findings: [{ ...makeRow('murmur', [30, null]), reason: 'heard none' }] }),
  others: [
    makeOther('blank', { findings: [makeRow('murmur', [null, null])] }),
    makeOther('elsewhere', { findings: [makeRow('fever', [50, 50])] }),
    makeOther('dr', { weight: 2, findings: [{ ...makeRow('murmur', [5, 10]), exposure: 'seldom' }] }),
  ],
});

describe('who said what about a row', () => {
  it('has everybody who judged it, oneself first, with blanks, exposure, weight and reason', () => {
    const lines = rowVoices(differential, murmur, 2, (voice) => (voice.you ? 1 : voice.weight));
    expect(lines.map(({ voice, exposure, weight, reason }) => [voice.key, exposure, weight, reason])).toEqual(
      [
        ['me', 'often', 1, 'heard none'],
        ['dr', 'seldom', 2, null],
      ],
    );
    expect(lines[0]?.shares[1]).toBeNull();
  });

  it('shows for an absent finding how many would not show it', () => {
    const [, dr] = rowVoices(differential, murmur, 2, () => null);
    expect(dr?.shares[0]).toBeCloseTo(0.95, 12);
    expect(dr?.shares[1]).toBeCloseTo(0.9, 12);
  });
});
