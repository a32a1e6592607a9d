import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';

/** What is left out of the standing for a look: one finding, or one contributor by their key. */
export interface LeftOut {
  kind: 'finding' | 'contributor';
  id: string;
}

/** How an element on the page says what pointing at it leaves out. */
export const leftOutAttribute = ({ kind, id }: LeftOut) => `${kind} ${id}`;

export function leftOutOf(attribute: string | undefined): LeftOut | null {
  const [kind, id] = attribute?.split(' ', 2) ?? [];
  return (kind === 'finding' || kind === 'contributor') && id !== undefined && id !== ''
    ? { kind, id }
    : null;
}

/**
 * The standing without it.
 * @returns null where nobody is left whose numbers count; undefined where leaving it out is no question (a pending
 *   finding, one that nobody judged, somebody whose numbers are not in the pool)
 */
export function standingWithout(
  { without }: Pick<AssessmentView, 'without'>,
  { kind, id }: LeftOut,
): readonly number[] | null | undefined {
  const of = kind === 'finding' ? without.findings : without.contributors;
  return Object.hasOwn(of, id) ? of[id] : undefined;
}
