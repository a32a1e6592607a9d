import { Button, TextField } from '@radix-ui/themes';
import type { Settings } from '@weighhouse/shared/contracts/cases';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { type SyntheticEvent, useState } from 'react';
import { ErrorSummary } from '../../../components/error-summary';
import { FailureLine } from '../../../components/failure';
import { fieldId } from '../../../components/faults';
import { FormField } from '../../../components/form-field';
import { isApiError } from '../../../lib/api-error';
import { type GroupInput, type GroupValues, groupsInput, newGroup, valuesOfGroups } from './group-values';
import './findings.css';

interface Props {
  groups: Settings['groups'];
  findings: readonly Finding[];
  /** Resolves to what is saved now. */
  onSave: (groups: GroupInput[], reason: string) => Promise<Pick<Settings, 'groups'>>;
}

/** The whole list of groups, changed at once and with a reason. */
export function GroupsForm({ groups, findings, onSave }: Props) {
  const [values, setValues] = useState<GroupValues[]>(() => valuesOfGroups(groups));
  const [known, setKnown] = useState(groups);
  // A group that was made elsewhere meanwhile joins what is typed here; else saving this list would dissolve it.
  const arrived = groups.filter((group) => known.every(({ id }) => id !== group.id));
  if (arrived.length > 0) {
    setKnown(groups);
    setValues([...values, ...valuesOfGroups(arrived)]);
  }
  const [reason, setReason] = useState('');
  const [error, setError] = useState<unknown>(null);
  const [state, setState] = useState<'typing' | 'saving' | 'saved'>('typing');
  const read = groupsInput(values, reason);
  const tried = error === 'own';
  const faults = tried ? read.faults : isApiError(error) ? error.fields : [];
  const set = (index: number, more: Partial<GroupValues>) => {
    setState('typing');
    setValues((known) => known.map((group, at) => (at === index ? { ...group, ...more } : group)));
  };
  const submit = async (event: SyntheticEvent) => {
    event.preventDefault();
    if (read.faults.length > 0) {
      setError('own');
      return;
    }
    setState('saving');
    setError(null);
    try {
      const saved = await onSave(read.groups, reason.trim());
      setKnown(saved.groups);
      setValues(valuesOfGroups(saved.groups));
      setReason('');
      setState('saved');
    } catch (failed) {
      setError(failed);
      setState('typing');
    }
  };
  const labels = Object.fromEntries(
    values.map((_, index) => [`groups.${String(index)}`, `Group ${String(index + 1)}`]),
  );
  return (
    <form className="finding-form" noValidate onSubmit={(event) => void submit(event)}>
      <ErrorSummary faults={faults} labels={{ ...labels, reason: 'Reason for the change' }} />
      {values.length === 0 && <p className="soft">No groups yet.</p>}
      {values.map((group, index) => (
        <fieldset
          key={group.id ?? index}
          className="group-fields"
          id={fieldId(`groups.${String(index)}`)}
          tabIndex={-1}
        >
          <legend>Group {index + 1}</legend>
          <TextField.Root
            aria-label={`Name of group ${String(index + 1)}`}
            placeholder="Name, such as General symptoms"
            maxLength={120}
            value={group.label}
            onChange={(event) => {
              set(index, { label: event.target.value });
            }}
          />
          <label className="overlap-line">
            Overlap, of 100
            <input
              className="number-field figures"
              inputMode="numeric"
              maxLength={3}
              value={group.overlap}
              onChange={(event) => {
                set(index, { overlap: event.target.value });
              }}
            />
          </label>
          <TextField.Root
            aria-label={`Why group ${String(index + 1)} overlaps`}
            placeholder="Why (may be left out)"
            maxLength={4000}
            value={group.reason}
            onChange={(event) => {
              set(index, { reason: event.target.value });
            }}
          />
          <p className="small soft">{memberWords(findings, group.id)}</p>
          <button
            type="button"
            className="text-button"
            onClick={() => {
              setState('typing');
              setValues(values.filter((_, at) => at !== index));
            }}
          >
            Dissolve group {index + 1}
          </button>
        </fieldset>
      ))}
      <Button
        type="button"
        variant="outline"
        onClick={() => {
          setState('typing');
          setValues([...values, newGroup]);
        }}
      >
        Add a group
      </Button>
      <FormField label="Reason for the change" path="reason" faults={faults}>
        {(control) => (
          <TextField.Root
            {...control}
            value={reason}
            maxLength={4000}
            onChange={(event) => {
              setReason(event.target.value);
            }}
          />
        )}
      </FormField>
      {!tried && faults.length === 0 && <FailureLine error={error} />}
      <div className="actions">
        <Button type="submit" loading={state === 'saving'}>
          Save groups
        </Button>
        <span className="small soft" role="status">
          {state === 'saved' ? 'Saved.' : ''}
        </span>
      </div>
    </form>
  );
}

function memberWords(findings: readonly Finding[], id: string | undefined): string {
  if (id === undefined) return 'Once it is saved, findings can join it.';
  const members = findings.filter((finding) => finding.groupId === id && !finding.enteredInError);
  return members.length === 0
    ? 'No finding is in it.'
    : `In it: ${members.map((finding) => finding.title).join('; ')}.`;
}
