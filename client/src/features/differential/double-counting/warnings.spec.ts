import { describe, expect, it } from 'vitest';
import { makeAssessment, makeDifferential, makeFinding } from '../testing/make-differential';
import { alikeness, clusters, isNotable } from './alike';
import { groupFor, warningsOf, warningWords } from './warnings';

const from = (id: string, reportId: string | null, groupId: string | null = null) =>
  makeFinding({
    id,
    title: `Finding ${id}`,
    groupId,
    source: reportId === null ? null : { reportId, fileName: 'Ultrasound.pdf', page: 1, text: null },
  });
const row = (weightOfEvidence: number[]) => ({ weightOfEvidence, by: {}, apart: null, swing: 0 });
const up = [3, -1, -1, -1];
const nearlyUp = [1.5, -0.4, -0.5, -0.6];
const roughlyUp = [2, 0.5, -1.5, -1];
const down = [-3, 1, 1, 1];
const faint = [0.3, -0.1, -0.1, -0.1];

describe('the measure of alikeness', () => {
  it('is Pearson’s correlation of rows that stand against their mean, whatever their length', () => {
    expect(
      alikeness(
        up,
        up.map((value) => value / 7),
      ),
    ).toBeCloseTo(1, 12);
    expect(alikeness(up, down)).toBeCloseTo(-1, 12);
    expect(alikeness(up, [0, 1, 0, -1])).toBeCloseTo(0, 12);
    expect(alikeness(up, [0, 0, 0, 0])).toBe(0);
  });

  it('is not asked of faint rows, of few columns or of pending rows', () => {
    expect([up, faint, [2, -2], []].map(isNotable)).toEqual([true, false, false, false]);
  });

  it('puts together what is linked through others, in the order given', () => {
    const near = (one: number, other: number) => Math.abs(one - other) <= 1;
    expect(clusters([9, 1, 3, 2, 7], near)).toEqual([[1, 3, 2]]);
    expect(clusters([1, 5], near)).toEqual([]);
  });
});

describe('what may count twice', () => {
  const findings = [from('a', 'r1'), from('b', 'r1'), from('c', 'r1'), from('d', null), from('e', null)];
  const assessment = makeAssessment({
    rows: { a: row(up), b: row(roughlyUp), c: row(down), d: row(nearlyUp), e: row(faint) },
  });
  const warned = (parts: Parameters<typeof makeDifferential>[0]) =>
    warningsOf(makeDifferential({ findings, assessment, ...parts })).map((warning) => [
      warning.kind,
      warning.findings.map(({ id }) => id).join(''),
    ]);

  it('warns of one report pushing the same way, and of nearly the same beams wherever they come from', () => {
    expect(warned({})).toEqual([
      ['reportAndWay', 'ab'],
      ['beams', 'ad'],
    ]);
  });

  it('says a set of findings once, where report and beams both speak of it', () => {
    const same = makeAssessment({ rows: { a: row(up), b: row(nearlyUp) } });
    expect(warned({ assessment: same })).toEqual([['reportAndWay', 'ab']]);
  });

  it('draws nothing from numbers while a round is sealed, not even from those of an earlier round', () => {
    expect(warned({ sealed: true })).toEqual([['report', 'abc']]);
    expect(warned({ sealed: true, assessment: null })).toEqual([['report', 'abc']]);
  });

  it('is still where they are grouped, and where two groups were made on purpose', () => {
    const grouped = (...groups: (string | null)[]) =>
      findings.map((finding, index) => ({ ...finding, groupId: groups[index] ?? null }));
    expect(warned({ findings: grouped('g', 'g', null, 'g') })).toEqual([]);
    expect(warned({ findings: grouped('g', 'h', null, 'h') })).toEqual([]);
    expect(warned({ findings: grouped('g', null, null, 'g') })).toEqual([['reportAndWay', 'ab']]);
  });

  it('leaves out what is pending or entered in error', () => {
    const gone = { words: 'wrong patient', by: 'Dr A', at: '2026-12-01T09:00:00.000Z' };
    expect(
      warned({
        findings: [
          { ...from('a', 'r1'), enteredInError: gone },
          from('b', 'r1'),
          { ...from('c', 'r1'), observed: null },
        ],
        sealed: true,
      }),
    ).toEqual([]);
  });

  it('asks, and names a group that the chair can keep', () => {
    const [report, beams] = warningsOf(makeDifferential({ findings, assessment }));
    if (!report || !beams) throw new Error('two warnings');
    expect(warningWords(report)).toBe(
      'These two come from one report (Ultrasound.pdf) and push the same way: do they count twice?',
    );
    expect(warningWords(beams)).toBe('These two have nearly the same beams: do they count twice?');
    expect(groupFor(report).label).toBe('From Ultrasound.pdf');
    const long = { ...beams, findings: beams.findings.map((one) => ({ ...one, title: 'x'.repeat(300) })) };
    expect(groupFor(long).label).toHaveLength(120);
  });
});
