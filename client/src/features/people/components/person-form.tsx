import { Button, Dialog, TextField } from '@radix-ui/themes';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import {
  type InvitePerson,
  invitePersonSchema,
  type Person,
  personSchema,
} from '@weighhouse/shared/contracts/people';
import { type SubmitEvent, useState } from 'react';
import { BothTexts } from '../../../components/both-texts';
import { ErrorSummary } from '../../../components/error-summary';
import { FailureLine } from '../../../components/failure';
import { faultsIn } from '../../../components/faults';
import { FormField } from '../../../components/form-field';
import { SelectBox } from '../../../components/select-box';
import { isApiError } from '../../../lib/api';
import { useCentres } from '../api/centres';
import { useChangePeople } from '../api/change-people';
import { PersonLines } from './person-lines';
import { RoleChoices } from './role-choices';

const labels = { email: 'E-mail', name: 'Name', specialty: 'Specialty', centreId: 'Centre', roles: 'Roles' };
type Typed = Omit<InvitePerson, 'email'> & { email: string };

function begin(person: Person | null): Typed {
  if (!person) return { email: '', name: '', specialty: '', centreId: '', roles: [] };
  const { name, specialty, centre, roles, email = '' } = person;
  return { email, name, specialty, centreId: centre.id, roles };
}

/** Invites somebody, or changes a person; the e-mail address of a person stays as it is. */
export function PersonForm({ person, onDone }: { person: Person | null; onDone: (said: string) => void }) {
  const [typed, setTyped] = useState(() => begin(person));
  const [faults, setFaults] = useState<FieldFault[]>([]);
  const [error, setError] = useState<unknown>(null);
  const centres = useCentres();
  const [version, setVersion] = useState(person?.version ?? 0);
  const { invite, change } = useChangePeople();
  const theirs = isApiError(error, 'stale') ? personSchema.safeParse(error.current).data : undefined;

  const submit = async (event: SubmitEvent) => {
    event.preventDefault();
    const found = faultsIn(invitePersonSchema, {
      ...typed,
      email: person ? 'known@known.example' : typed.email,
    });
    setFaults(
      found.map((fault) => (fault.path === 'centreId' ? { ...fault, message: 'must be chosen' } : fault)),
    );
    setError(null);
    if (found.length > 0) return;
    const { email, ...rest } = typed;
    try {
      if (person) await change.mutateAsync({ id: person.id, version, ...rest });
      else await invite.mutateAsync({ email, ...rest });
      onDone(person ? `${rest.name} is changed.` : `The invitation to ${email} is on its way.`);
    } catch (failed) {
      if (isApiError(failed)) setFaults(failed.fields);
      setError(failed);
    }
  };

  const line = (path: 'email' | 'name' | 'specialty', hint?: string) => (
    <FormField label={labels[path]} path={path} faults={faults} hint={hint}>
      {(control) => (
        <TextField.Root
          {...control}
          type={path === 'email' ? 'email' : 'text'}
          value={typed[path]}
          onChange={(event) => {
            setTyped({ ...typed, [path]: event.target.value });
          }}
        />
      )}
    </FormField>
  );

  return (
    <form onSubmit={(event) => void submit(event)} noValidate>
      <ErrorSummary faults={faults} labels={labels} title="Please mend this first" />
      {theirs && (
        <BothTexts
          what="this person"
          mine={<PersonLines {...typed} centres={centres.data?.items ?? []} />}
          theirs={<PersonLines {...begin(theirs)} centres={centres.data?.items ?? []} />}
          onKeepMine={() => {
            setVersion(theirs.version);
            setError(null);
          }}
          onTakeTheirs={() => {
            setTyped(begin(theirs));
            setVersion(theirs.version);
            setError(null);
          }}
        />
      )}
      {!person && line('email', 'The invitation goes there, with a link that works once.')}
      {line('name', 'As colleagues write it, with the title.')}
      {line('specialty')}
      <FormField label={labels.centreId} path="centreId" faults={faults}>
        {(control) => (
          <SelectBox
            {...control}
            value={typed.centreId}
            onChange={(event) => {
              setTyped({ ...typed, centreId: event.target.value });
            }}
          >
            <option value="">Choose a centre</option>
            {(centres.data?.items ?? []).map((centre) => (
              <option key={centre.id} value={centre.id}>
                {centre.name}
              </option>
            ))}
          </SelectBox>
        )}
      </FormField>
      <RoleChoices
        faults={faults}
        roles={typed.roles}
        onChange={(roles) => {
          setTyped({ ...typed, roles });
        }}
      />
      {faults.length === 0 && !theirs && <FailureLine error={error} />}
      <div className="actions">
        <Button type="submit" loading={invite.isPending || change.isPending}>
          {person ? 'Save changes' : 'Send invitation'}
        </Button>
        <Dialog.Close>
          <Button type="button" variant="outline" color="gray" highContrast>
            Cancel
          </Button>
        </Dialog.Close>
      </div>
    </form>
  );
}
