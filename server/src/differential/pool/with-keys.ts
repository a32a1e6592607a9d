import type { Assessment } from '@weighhouse/shared/reasoning/assess';

/**
 * The same assessment with other keys for its contributors: who may not see whose numbers they are gets the numbers of
 * those who may, to the last digit.
 * @param keys the new key of each contributor by the old one
 */
export function withKeys(assessment: Assessment, keys: ReadonlyMap<string, string>): Assessment {
  const key = (old: string): string => {
    const known = keys.get(old);
    if (known === undefined) throw new TypeError('every contributor has a key');
    return known;
  };
  const renamed = <T>(byContributor: Record<string, T>): Record<string, T> =>
    Object.fromEntries(Object.entries(byContributor).map(([old, value]) => [key(old), value]));
  const pole = ({ contributor, p }: { contributor: string; p: number }) => ({
    contributor: key(contributor),
    p,
  });
  return {
    ...assessment,
    own: renamed(assessment.own),
    rows: Object.fromEntries(
      Object.entries(assessment.rows).map(([finding, { by, apart, ...row }]) => [
        finding,
        {
          ...row,
          by: renamed(by),
          apart: apart && { column: apart.column, low: pole(apart.low), high: pole(apart.high) },
        },
      ]),
    ),
    without: { ...assessment.without, contributors: renamed(assessment.without.contributors) },
  };
}
