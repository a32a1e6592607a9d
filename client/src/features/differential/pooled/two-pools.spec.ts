import { describe, expect, it } from 'vitest';
import { columnsOf } from '../model/columns';
import { makeCandidate } from '../testing/make-differential';
import { partingWords } from './two-pools';

const columns = columnsOf([makeCandidate('Still'), makeCandidate('Lymphoma')]);

describe('the two pools in words', () => {
  it('names the column on which they part most, whichever is larger', () => {
    expect(partingWords({ standing: [0.61, 0.17, 0.22], linearPool: [0.52, 0.28, 0.2] }, columns)).toMatch(
      /Here they part, most on B Lymphoma: 17 in the pool, 28 of 100 on average\.$/,
    );
  });

  it('says where they hardly part, and where not by a whole number', () => {
    expect(partingWords({ standing: [0.61, 0.17, 0.22], linearPool: [0.59, 0.18, 0.23] }, columns)).toMatch(
      /hardly part, most on A Still: 61 in the pool, 59 of 100 on average\.$/,
    );
    expect(partingWords({ standing: [0.61, 0.17, 0.22], linearPool: [0.612, 0.17, 0.218] }, columns)).toMatch(
      /do not part by a whole number anywhere\.$/,
    );
  });

  it('never says 0 or 100 of 100', () => {
    const words = partingWords({ standing: [1, 0, 0], linearPool: [0.9, 0.1, 0] }, columns);
    expect(words).toMatch(/over 99 in the pool, 90 of 100|under 1 in the pool, 10 of 100/);
  });
});
