import { Button, TextArea, TextField } from '@radix-ui/themes';
import { newCandidateSchema } from '@weighhouse/shared/contracts/findings';
import { type SyntheticEvent, useState } from 'react';
import { FailureLine } from '../../../components/failure';
import { faultsIn } from '../../../components/faults';
import { FormField } from '../../../components/form-field';
import { isApiError } from '../../../lib/api-error';
import { useAddCandidate } from '../../findings/api/add-candidate';

const empty = { name: '', detail: '', mustNotMiss: false };

/** Adds a possible diagnosis. */
export function CandidateForm({ caseId }: { caseId: string }) {
  const add = useAddCandidate(caseId);
  const [values, setValues] = useState(empty);
  const [tried, setTried] = useState(false);
  const own = tried ? faultsIn(newCandidateSchema, values) : [];
  const faults = own.length > 0 ? own : isApiError(add.error) ? add.error.fields : [];
  const submit = (event: SyntheticEvent) => {
    event.preventDefault();
    setTried(true);
    if (faultsIn(newCandidateSchema, values).length > 0) return;
    add.mutate(values, {
      onSuccess: () => {
        setTried(false);
        setValues(empty);
      },
    });
  };
  return (
    <form className="finding-form" noValidate onSubmit={submit}>
      <h3 className="side-sub">Add a candidate</h3>
      <FormField label="Name" path="name" faults={faults}>
        {(control) => (
          <TextField.Root
            {...control}
            maxLength={160}
            value={values.name}
            onChange={(event) => {
              setValues({ ...values, name: event.target.value });
            }}
          />
        )}
      </FormField>
      <FormField label="What is meant by it" path="detail" faults={faults} optional>
        {(control) => (
          <TextArea
            {...control}
            rows={2}
            maxLength={1000}
            value={values.detail}
            onChange={(event) => {
              setValues({ ...values, detail: event.target.value });
            }}
          />
        )}
      </FormField>
      <label className="check-line">
        <input
          type="checkbox"
          checked={values.mustNotMiss}
          onChange={(event) => {
            setValues({ ...values, mustNotMiss: event.target.checked });
          }}
        />
        Must not be missed
      </label>
      {faults.length === 0 && <FailureLine error={add.error} />}
      <div className="actions">
        <Button type="submit" loading={add.isPending}>
          Add candidate
        </Button>
      </div>
    </form>
  );
}
