import type { ChangePerson, Person } from '@weighhouse/shared/contracts/people';

/** What an administrator changed, as the rest of a sentence for the trail. */
export function changeSentence(before: Person, input: ChangePerson): string {
  const parts = [
    input.active === false && before.active === true && 'deactivated',
    input.active === true && before.active === false && 'activated',
    input.name !== undefined && input.name !== before.name && `name to ${input.name}`,
    input.specialty !== undefined &&
      input.specialty !== before.specialty &&
      `specialty to ${input.specialty}`,
    input.centreId !== undefined && input.centreId !== before.centre.id && 'centre',
    input.roles !== undefined &&
      !sameRoles(input.roles, before.roles) &&
      `roles from ${before.roles.join(', ')} to ${input.roles.join(', ')}`,
  ].filter((part) => part !== false);
  return `changed the entry of ${before.name}: ${parts.length > 0 ? parts.join('; ') : 'nothing new'}`;
}

const sameRoles = (a: readonly string[], b: readonly string[]): boolean =>
  new Set(a).size === new Set(b).size && a.every((role) => b.includes(role));
