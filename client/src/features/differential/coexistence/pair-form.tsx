import { Button, TextField } from '@radix-ui/themes';
import { type SyntheticEvent, useState } from 'react';
import { FormField, type ControlProps } from '../../../components/form-field';
import { SelectBox } from '../../../components/select-box';
import { useLedger } from '../ledger/ledger-context';
import { columnLabel } from '../model/columns';
import { emptyPair, type Pair, type PairValues, valuesOfPair, withPair } from './pair-values';

interface Props {
  pairs: readonly Pair[];
  /** Null adds one. */
  editing: Pair | null;
  busy: boolean;
  onSave: (together: ReturnType<typeof withPair>['together'], reason: string) => void;
  onCancel: () => void;
}

/** "A makes B so many times as likely", with a reason. */
export function PairForm({ pairs, editing, busy, onSave, onCancel }: Props) {
  const [values, setValues] = useState<PairValues>(() => (editing ? valuesOfPair(editing) : emptyPair));
  const [tried, setTried] = useState(false);
  const read = withPair(pairs, values, editing);
  const faults = tried ? read.faults : [];
  const set = (more: Partial<PairValues>) => {
    setValues((known) => ({ ...known, ...more }));
  };
  const submit = (event: SyntheticEvent) => {
    event.preventDefault();
    setTried(true);
    if (read.faults.length === 0) onSave(read.together, values.reason.trim());
  };
  return (
    <form className="pair-form" noValidate onSubmit={submit}>
      <FormField label="This candidate" path="pair.a" faults={faults}>
        {(control) => (
          <CandidateChoice
            control={control}
            value={values.a}
            onChange={(a) => {
              set({ a });
            }}
          />
        )}
      </FormField>
      <FormField label="makes this one" path="pair.b" faults={faults}>
        {(control) => (
          <CandidateChoice
            control={control}
            value={values.b}
            onChange={(b) => {
              set({ b });
            }}
          />
        )}
      </FormField>
      <FormField
        label="so many times as likely"
        path="pair.times"
        faults={faults}
        hint="3 for three times, 0.5 for half, 0 for never together. At most 100."
      >
        {(control) => (
          <input
            {...control}
            className="number-field figures"
            inputMode="decimal"
            maxLength={6}
            value={values.times}
            onChange={(event) => {
              set({ times: event.target.value });
            }}
          />
        )}
      </FormField>
      <FormField label="Why" path="pair.reason" faults={faults}>
        {(control) => (
          <TextField.Root
            {...control}
            maxLength={4000}
            value={values.reason}
            onChange={(event) => {
              set({ reason: event.target.value });
            }}
          />
        )}
      </FormField>
      <div className="actions">
        <Button type="submit" loading={busy}>
          Save the pair
        </Button>
        <Button type="button" variant="outline" disabled={busy} onClick={onCancel}>
          Leave it
        </Button>
      </div>
    </form>
  );
}

function CandidateChoice({
  control,
  value,
  onChange,
}: {
  control: ControlProps;
  value: string;
  onChange: (id: string) => void;
}) {
  const { columns } = useLedger();
  return (
    <SelectBox
      {...control}
      value={value}
      onChange={(event) => {
        onChange(event.target.value);
      }}
    >
      <option value="">Choose</option>
      {columns
        .filter((column) => !column.none)
        .map((column) => (
          <option key={column.id} value={column.id}>
            {columnLabel(column)}
          </option>
        ))}
    </SelectBox>
  );
}
