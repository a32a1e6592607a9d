import type { Seat } from './team-form';

/** Names of the fields by path, for the list of faults. A person's fields are named by the message itself. */
export function labelsOf(seats: readonly Seat[]): Record<string, string> {
  const own = seats.flatMap((seat) => [
    [`seats.${seat.personId}.weight`, 'Weight'],
    [`seats.${seat.personId}.reason`, 'Reason'],
  ]);
  return {
    ...(Object.fromEntries(own) as Record<string, string>),
    contributors: 'Contributors',
    liaisons: 'Liaison',
    conferenceAt: 'Conference',
    quorum: 'Quorum',
  };
}
