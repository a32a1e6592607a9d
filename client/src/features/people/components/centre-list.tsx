import { Button, TextField } from '@radix-ui/themes';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { newCentreSchema } from '@weighhouse/shared/contracts/people';
import { type SubmitEvent, useState } from 'react';
import { FailureLine } from '../../../components/failure';
import { faultsIn } from '../../../components/faults';
import { FormField } from '../../../components/form-field';
import { isApiError } from '../../../lib/api';
import { useAddCentre, useCentres } from '../api/centres';

const empty = { code: '', name: '' };
/** A person’s form on the same page has a name as well, and every control needs an id of its own. */
const own = (path: string) => `centre.${path}`;

/** The hospitals and practices that people work at, and a new one. */
export function CentreList() {
  const centres = useCentres();
  const add = useAddCentre();
  const [typed, setTyped] = useState(empty);
  const [faults, setFaults] = useState<FieldFault[]>([]);

  const submit = async (event: SubmitEvent) => {
    event.preventDefault();
    const found = faultsIn(newCentreSchema, typed);
    setFaults(found);
    if (found.length > 0) return;
    try {
      await add.mutateAsync(typed);
      setTyped(empty);
    } catch (error) {
      if (isApiError(error)) setFaults(error.fields);
    }
  };

  const field = (path: 'code' | 'name', label: string) => (
    <FormField
      label={label}
      path={own(path)}
      faults={faults.map((fault) => ({ ...fault, path: own(fault.path) }))}
    >
      {(control) => (
        <TextField.Root
          {...control}
          value={typed[path]}
          onChange={(event) => {
            setTyped({ ...typed, [path]: event.target.value });
          }}
        />
      )}
    </FormField>
  );

  return (
    <section aria-labelledby="centres">
      <div className="section-head">
        <h2 id="centres">Centres</h2>
      </div>
      <ul className="people-list">
        {(centres.data?.items ?? []).map((centre) => (
          <li key={centre.id}>
            <span>
              {centre.name} <span className="soft figures">{centre.code}</span>
            </span>
          </li>
        ))}
      </ul>
      <form className="centre-form" onSubmit={(event) => void submit(event)} noValidate>
        {field('code', 'Short name')}
        {field('name', 'Name of the centre')}
        <Button type="submit" variant="outline" color="gray" highContrast loading={add.isPending}>
          Add centre
        </Button>
      </form>
      {faults.length === 0 && <FailureLine error={add.error} />}
    </section>
  );
}
