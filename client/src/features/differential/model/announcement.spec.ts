import { describe, expect, it } from 'vitest';
import { makeCandidate } from '../testing/make-differential';
import { changeSentence, StandingAnnouncer } from './announcement';
import { columnsOf } from './columns';

const columns = columnsOf([makeCandidate("Still's disease"), makeCandidate('Lymphoma')]);

describe('a change of the standing in words', () => {
  it('names the column that moved most', () => {
    expect(changeSentence([0.58, 0.2, 0.22], [0.61, 0.18, 0.21], columns)).toBe(
      "Still's disease now 61 of 100, was 58",
    );
  });

  it('says nothing where no whole number changed', () => {
    expect(changeSentence([0.581, 0.2, 0.219], [0.584, 0.2, 0.216], columns)).toBeNull();
  });

  it('never says 0', () => {
    expect(changeSentence([0.02, 0.5, 0.48], [0.001, 0.509, 0.49], columns)).toBe(
      "Still's disease now under 1 of 100, was 2",
    );
  });

  it('says nothing across a change of the columns', () => {
    expect(changeSentence([0.5, 0.5], [0.2, 0.3, 0.5], columns)).toBeNull();
  });
});

describe('the announcer', () => {
  const standings = [
    [0.5, 0.3, 0.2],
    [0.6, 0.2, 0.2],
    [0.7, 0.1, 0.2],
  ] as const;

  it('is silent at first, speaks at once, then not again for five seconds', () => {
    const announcer = new StandingAnnouncer();
    expect(announcer.hear(standings[0], columns, 0)).toBeNull();
    expect(announcer.hear(standings[1], columns, 1000)).toEqual({
      say: "Still's disease now 60 of 100, was 50",
    });
    expect(announcer.hear(standings[2], columns, 2000)).toEqual({ wait: 4000 });
    expect(announcer.hear(standings[2], columns, 6000)).toEqual({
      say: "Still's disease now 70 of 100, was 60",
    });
  });

  it('says nothing where the standing came back meanwhile', () => {
    const announcer = new StandingAnnouncer();
    announcer.hear(standings[0], columns, 0);
    announcer.hear(standings[1], columns, 0);
    expect(announcer.hear(standings[2], columns, 1)).toEqual({ wait: 4999 });
    expect(announcer.hear(standings[1], columns, 5000)).toBeNull();
  });
});
