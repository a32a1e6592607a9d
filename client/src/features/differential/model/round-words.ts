import type { Round } from '@weighhouse/shared/contracts/rounds';
import { counted } from '../../../lib/words';

/** How many of a round's contributors are in, and what the quorum still wants. */
export interface RoundCount {
  in: number;
  of: number;
  quorum: number;
  quorumIn: boolean;
  deadlinePast: boolean;
  /** The chair may unseal now; below the quorum only with a reason. */
  mayUnseal: 'yes' | 'withReason' | 'no';
}

/** Two in are needed in any case: fewer would not be a panel (product.md). */
const leastIn = 2;

export function roundCount(round: Round, quorum: number, now: Date): RoundCount {
  const inNow = round.members.filter((member) => member.handedInAt !== null).length;
  const quorumIn = inNow >= quorum;
  const deadlinePast = round.deadline !== null && new Date(round.deadline) <= now;
  const mayUnseal = quorumIn ? 'yes' : deadlinePast && inNow >= leastIn ? 'withReason' : 'no';
  return { in: inNow, of: round.members.length, quorum, quorumIn, deadlinePast, mayUnseal };
}

export function roundTitle(round: Round): string {
  const name = `Round ${String(round.number)}`;
  if (round.state === 'closed') return `${name} is closed`;
  if (round.state === 'unsealed') return `${name}, unsealed`;
  return `${name}, ${round.kind}`;
}

/** What stands in the way of unsealing, in words for the chair. */
export function unsealHindrance(
  { in: inNow, quorum, deadlinePast }: RoundCount,
  hasDeadline: boolean,
): string {
  const missing = counted(Math.max(0, quorum - inNow), 'more contributor');
  if (!hasDeadline) return `Unsealing needs ${missing} handed in.`;
  if (!deadlinePast) return `Unsealing needs ${missing} handed in, or the deadline past and two in.`;
  return 'The deadline is past, but fewer than two have handed in.';
}

/** What the round means for whoever looks at its numbers. */
export function roundSentence(round: Round): string {
  const name = `Round ${String(round.number)}`;
  if (round.state === 'closed') return `${name} is closed: nobody judges at the moment.`;
  if (round.state === 'unsealed') return `${name} is unsealed: everybody sees all numbers.`;
  if (round.kind === 'sealed') return `${name} is sealed: nobody sees anyone else’s numbers, nor the pool.`;
  return `${name} is live: every saved judgement moves the pool at once.`;
}
