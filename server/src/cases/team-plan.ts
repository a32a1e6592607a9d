import { mayTakePart } from '@weighhouse/shared/access/can';
import type { Part, TeamMemberInput } from '@weighhouse/shared/contracts/cases';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { Role } from '@weighhouse/shared/contracts/people';

/** A part as it is held, was held, or shall be held. */
export interface Seat {
  personId: string;
  part: Part;
  weight: number | null;
  reason: string | null;
}
interface KnownSeat extends Seat {
  leftAt: Date | null;
}
interface Somebody {
  name: string;
  roles: readonly Role[];
  active: boolean;
}

export interface TeamQuestion {
  input: readonly TeamMemberInput[];
  /** Every seat the case ever had. */
  known: readonly KnownSeat[];
  people: ReadonlyMap<string, Somebody>;
  referrerId: string;
  /** Who is the chair unless the input names another; null before a chair has accepted. */
  chairId: string | null;
  /** The chair who is accepting now; nobody else can be named chair then. */
  acceptingChairId?: string;
  /** Put in front of the paths, for a team that is one field of a larger input. */
  prefix: string;
}

export interface TeamAnswer {
  seats: Seat[];
  faults: FieldFault[];
}

const mostContributors = 25;

/**
 * The team that an input asks for, with every fault in it. The referrer stays, and the chair unless another is named.
 * A weight that is left out stays as it is, or is 1 for somebody new.
 */
export function planTeam(question: TeamQuestion): TeamAnswer {
  const faults = question.input.flatMap((item, index) =>
    seatFaults(question, item, `${question.prefix}[${String(index)}]`, index),
  );
  const seats = question.input
    .filter((item) => item.part !== 'referrer')
    .map((item) => seatOf(item, standing(question, item)));
  const chairs = seats.filter((seat) => seat.part === 'chair');
  if (chairs.length > 1) faults.push({ path: question.prefix, message: 'must name one chair, not several' });
  if (chairs.length === 0 && question.chairId !== null) seats.unshift(plainSeat(question.chairId, 'chair'));
  if (seats.filter((seat) => seat.part === 'contributor').length > mostContributors) {
    faults.push({
      path: question.prefix,
      message: `must have at most ${String(mostContributors)} contributors`,
    });
  }
  return { seats: [plainSeat(question.referrerId, 'referrer'), ...seats], faults };
}

/** What a team lacks before a case can be judged. */
export function missingInTeam(seats: readonly Seat[], path: string): FieldFault[] {
  const count = (part: Part): number => seats.filter((seat) => seat.part === part).length;
  const missing: FieldFault[] = [];
  if (count('contributor') < 2) missing.push({ path, message: 'must have at least two contributors' });
  if (count('liaison') < 1) missing.push({ path, message: 'must have a liaison' });
  return missing;
}

/** Contributors whose weight would change, also by leaving and coming back. */
export function changedWeights(seats: readonly Seat[], known: readonly KnownSeat[]): Seat[] {
  return seats.filter((seat) => {
    const before = known.find((other) => sameSeat(seat, other));
    return before !== undefined && before.weight !== seat.weight;
  });
}

export const sameSeat = (
  one: Pick<Seat, 'personId' | 'part'>,
  other: Pick<Seat, 'personId' | 'part'>,
): boolean => one.personId === other.personId && one.part === other.part;

const plainSeat = (personId: string, part: Part): Seat => ({ personId, part, weight: null, reason: null });

/** The seat that the person of an input item holds now. */
const standing = (question: TeamQuestion, item: TeamMemberInput): KnownSeat | undefined =>
  question.known.find((seat) => seat.leftAt === null && sameSeat(seat, item));

function seatOf(item: TeamMemberInput, now: Seat | undefined): Seat {
  const reason = item.reason === undefined || item.reason === '' ? null : item.reason;
  if (item.part !== 'contributor') return { ...plainSeat(item.personId, item.part), reason };
  const weight = item.weight ?? now?.weight ?? 1;
  const kept = weight === now?.weight ? now.reason : null;
  return { ...plainSeat(item.personId, item.part), weight, reason: reason ?? kept };
}

function seatFaults(
  question: TeamQuestion,
  item: TeamMemberInput,
  path: string,
  index: number,
): FieldFault[] {
  const faults: FieldFault[] = [];
  const fault = (field: string, message: string): number => faults.push({ path: `${path}${field}`, message });
  const now = standing(question, item);
  const person = question.people.get(item.personId);
  const accepting = question.acceptingChairId !== undefined;
  if (!person) fault('.personId', 'is nobody we know');
  else if (item.part !== 'referrer' && (now === undefined || accepting)) {
    if (!person.active) fault('.personId', `${person.name} has been deactivated`);
    if (!mayTakePart(person.roles, item.part))
      fault('.part', `${person.name} does not hold the role that this takes`);
  }
  if (item.part === 'referrer' && item.personId !== question.referrerId) {
    fault('.personId', 'the referrer of a case cannot be changed');
  }
  if (item.part === 'chair' && accepting && item.personId !== question.acceptingChairId) {
    fault('.personId', 'whoever accepts the case becomes its chair');
  }
  if (question.input.slice(0, index).some((earlier) => sameSeat(earlier, item))) fault('', 'is named twice');
  if (item.part !== 'contributor' && item.weight !== undefined) {
    fault('.weight', 'only contributors have a weight');
  }
  const seat = seatOf(item, now);
  if (seat.weight !== null && seat.weight !== 1 && seat.reason === null) {
    fault('.reason', 'must say why the weight is not 1');
  }
  return faults;
}
