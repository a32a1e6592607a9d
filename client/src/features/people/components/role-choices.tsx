import { Checkbox } from '@radix-ui/themes';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { type Role, roles as allRoles } from '@weighhouse/shared/contracts/people';
import { FieldGroup } from '../../../components/form-field';
import { capital } from '../../../lib/words';
import { roleHints } from './role-words';

interface Props {
  roles: readonly Role[];
  faults: readonly FieldFault[];
  onChange: (roles: Role[]) => void;
}

/** The roles a person holds, each with what it is for. */
export function RoleChoices({ roles, faults, onChange }: Props) {
  return (
    <FieldGroup label="Roles" path="roles" faults={faults}>
      <div className="role-choices">
        {allRoles.map((role) => (
          <label key={role}>
            <Checkbox
              checked={roles.includes(role)}
              onCheckedChange={(checked) => {
                onChange(allRoles.filter((one) => (one === role ? checked === true : roles.includes(one))));
              }}
            />
            <span>
              {capital(role)} <span className="soft">{roleHints[role]}</span>
            </span>
          </label>
        ))}
      </div>
    </FieldGroup>
  );
}
