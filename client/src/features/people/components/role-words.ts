import type { Person, Role } from '@weighhouse/shared/contracts/people';
import { capital, listed } from '../../../lib/words';

export const roleHints: Record<Role, string> = {
  referrer: 'opens cases and answers questions',
  specialist: 'judges cases they are invited to',
  chair: 'accepts cases and leads their conference',
  liaison: 'tells the patient',
  administrator: 'looks after people, and sees no clinical word',
};

/** "Specialist and chair". */
export function rolesLine(roles: readonly Role[]): string {
  return capital(listed(roles));
}

/** How far a person has come: "Active", "Invited, not here yet", "Deactivated". */
export function personState(person: Pick<Person, 'active' | 'invited'>): string {
  if (person.active === false) return 'Deactivated';
  return person.invited === true ? 'Invited, not here yet' : 'Active';
}
