import type { Part, TeamMember, TeamMemberInput } from '@weighhouse/shared/contracts/cases';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';

/** A seat as it is typed. */
export interface Seat {
  personId: string;
  name: string;
  /** Specialty and centre. */
  from: string;
  part: Part;
  /** Contributors alone, as typed. */
  weight: string;
  reason: string;
}

export function seatsOf(team: readonly TeamMember[]): Seat[] {
  return team.map(({ person, part, weight, reason }) => ({
    personId: person.id,
    name: person.name,
    from: `${person.specialty}, ${person.centre}`,
    part,
    weight: weight === null ? '1' : String(weight),
    reason: reason ?? '',
  }));
}

/** A weight as it is typed, 0 to 3; null for anything else. A decimal comma is understood. */
export function parseWeight(typed: string): number | null {
  const text = typed.trim().replace(',', '.');
  if (!/^\d(\.\d{1,2})?$/.test(text)) return null;
  const weight = Number(text);
  return weight <= 3 ? weight : null;
}

/** The team as the server takes it. The referrer stays without being named. */
export function inputOf(seats: readonly Seat[]): TeamMemberInput[] {
  return seats
    .filter((seat) => seat.part !== 'referrer')
    .map((seat) => ({
      personId: seat.personId,
      part: seat.part,
      ...(seat.part === 'contributor' ? { weight: parseWeight(seat.weight) ?? 1 } : {}),
      ...(seat.reason.trim() === '' ? {} : { reason: seat.reason.trim() }),
    }));
}

/** Of the faults shown, those that these seats still have; faults of other fields stay. */
export function stillWrong(faults: readonly FieldFault[], seats: readonly Seat[]): FieldFault[] {
  const now = teamFaults(seats).map(({ path }) => path);
  const ofTeam = (path: string) => /^(seats\.|contributors$|liaisons$)/.test(path);
  return faults.filter(({ path }) => !ofTeam(path) || now.includes(path));
}

/** What is wrong with the team before it is sent; paths as `seats.<person>.weight` and `team`. */
export function teamFaults(seats: readonly Seat[]): FieldFault[] {
  const contributors = seats.filter((seat) => seat.part === 'contributor');
  const faults = contributors.flatMap((seat) => {
    const weight = parseWeight(seat.weight);
    if (weight === null)
      return [
        { path: `seats.${seat.personId}.weight`, message: `must be a number from 0 to 3 for ${seat.name}` },
      ];
    if (weight !== 1 && seat.reason.trim() === '')
      return [
        { path: `seats.${seat.personId}.reason`, message: `must say why ${seat.name} does not count as 1` },
      ];
    return [];
  });
  if (contributors.length < 2) faults.push({ path: 'contributors', message: 'must be at least two' });
  if (!seats.some((seat) => seat.part === 'liaison'))
    faults.push({ path: 'liaisons', message: 'must be at least one, who tells the patient' });
  return faults;
}
