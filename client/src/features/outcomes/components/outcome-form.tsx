import { Button, TextArea, TextField } from '@radix-ui/themes';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { type OutcomeInput, outcomeInputSchema } from '@weighhouse/shared/contracts/outcomes';
import { z } from 'zod';
import { type SubmitEvent, useState } from 'react';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { ErrorSummary } from '../../../components/error-summary';
import { faultsIn } from '../../../components/faults';
import { FormField } from '../../../components/form-field';
import { SelectBox } from '../../../components/select-box';
import { isApiError } from '../../../lib/api';
import { useFormat } from '../../../lib/use-format';
import { useDifferential } from '../../differential/api/get-differential';
import { useRecordOutcome } from '../api/record-outcome';
import { useKept } from '../../../lib/use-kept';

const labels = {
  candidateId: 'Which candidate it was',
  diagnosis: 'The diagnosis',
  howKnown: 'How it is known',
  knownOn: 'Known since',
};
const none = 'none';
const textSchema = z.object({
  /** A candidate's id, `none`, or empty while nothing is chosen. */
  candidate: z.string(),
  diagnosis: z.string(),
  howKnown: z.string(),
  knownOn: z.string(),
});
const empty = { candidate: '', diagnosis: '', howKnown: '', knownOn: '' };

/** Records the outcome, after a question, because it stands for good. */
export function OutcomeForm({ caseId, onClose }: { caseId: string; onClose: () => void }) {
  const differential = useDifferential(caseId);
  const record = useRecordOutcome(caseId);
  const format = useFormat();
  const [typed, setTyped, clear] = useKept(`outcome.${caseId}`, textSchema, empty);
  const [faults, setFaults] = useState<FieldFault[]>([]);
  const [asking, setAsking] = useState(false);
  const candidates = (differential.data?.candidates ?? []).filter((one) => !one.retired);
  const { candidate, ...rest } = typed;
  const input: OutcomeInput = { ...rest, candidateId: candidate === none ? null : candidate };

  const check = (event: SubmitEvent) => {
    event.preventDefault();
    const found = faultsIn(outcomeInputSchema, input).filter((fault) => fault.path !== 'candidateId');
    if (candidate === '')
      found.unshift({ path: 'candidateId', message: 'must be a candidate, or none of them' });
    if (typed.knownOn > format.today()) found.push({ path: 'knownOn', message: 'must not be in the future' });
    setFaults(found);
    setAsking(found.length === 0);
  };
  const send = async () => {
    try {
      await record.mutateAsync(input);
      clear();
    } catch (error) {
      if (isApiError(error)) setFaults(error.fields);
      throw error;
    }
  };
  const put = (change: Partial<typeof typed>) => {
    setTyped({ ...typed, ...change });
  };

  return (
    <form className="outcome-form no-print" onSubmit={check} noValidate>
      <ErrorSummary faults={faults} labels={labels} title="The outcome was not recorded" />
      <FormField label={labels.diagnosis} path="diagnosis" faults={faults}>
        {(control) => (
          <TextField.Root
            {...control}
            maxLength={300}
            value={typed.diagnosis}
            onChange={(event) => {
              put({ diagnosis: event.target.value });
            }}
          />
        )}
      </FormField>
      <FormField label={labels.candidateId} path="candidateId" faults={faults}>
        {(control) => (
          <SelectBox
            {...control}
            value={candidate}
            onChange={(event) => {
              put({ candidate: event.target.value });
            }}
          >
            <option value="">Choose</option>
            {candidates.map((one) => (
              <option key={one.id} value={one.id}>
                {one.name}
              </option>
            ))}
            <option value={none}>None of these</option>
          </SelectBox>
        )}
      </FormField>
      <FormField
        label={labels.howKnown}
        path="howKnown"
        faults={faults}
        hint="For instance a biopsy, the course under treatment, time."
      >
        {(control) => (
          <TextArea
            {...control}
            rows={3}
            maxLength={4000}
            value={typed.howKnown}
            onChange={(event) => {
              put({ howKnown: event.target.value });
            }}
          />
        )}
      </FormField>
      <FormField label={labels.knownOn} path="knownOn" faults={faults}>
        {(control) => (
          <TextField.Root
            {...control}
            type="date"
            max={format.today()}
            value={typed.knownOn}
            onChange={(event) => {
              put({ knownOn: event.target.value });
            }}
          />
        )}
      </FormField>
      <div className="actions">
        <Button type="submit">Record the outcome</Button>
        <Button type="button" variant="outline" onClick={onClose}>
          Not now
        </Button>
      </div>
      <ConfirmDialog
        open={asking}
        onOpenChange={setAsking}
        title="Record this outcome for good?"
        verb="Record the outcome"
        onConfirm={send}
      >
        {`It turned out to be ${typed.diagnosis}. The whole team sees it, and it cannot be changed afterwards.`}
      </ConfirmDialog>
    </form>
  );
}
