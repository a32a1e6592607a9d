import type { Centre, Role } from '@weighhouse/shared/contracts/people';
import { rolesLine } from './role-words';

interface Props {
  name: string;
  specialty: string;
  centreId: string;
  roles: readonly Role[];
  centres: readonly Centre[];
}

/** A person in three lines, to compare two versions. */
export function PersonLines({ name, specialty, centreId, roles, centres }: Props) {
  return (
    <p>
      {name}
      <br />
      {specialty}, {centres.find((centre) => centre.id === centreId)?.name ?? 'no centre'}
      <br />
      {rolesLine(roles)}
    </p>
  );
}
