import { RadioGroup, TextField } from '@radix-ui/themes';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { FieldGroup, FormField } from '../../../components/form-field';

export interface ConferenceTyped {
  /** Not chosen, no date yet, or a date. */
  choice: '' | 'notYet' | 'date';
  /** As a datetime-local field has it. */
  at: string;
}

/** The choice and the date are two controls of one path of the contract, and each needs its own id. */
const datePath = 'conferenceAt.date';

interface Props {
  value: ConferenceTyped;
  faults: readonly FieldFault[];
  timeZone: string;
  onChange: (value: ConferenceTyped) => void;
}

/** The date of the conference, or "not yet" as an answer of its own. */
export function ConferenceField({ value, faults, timeZone, onChange }: Props) {
  return (
    <>
      <FieldGroup label="Conference" path="conferenceAt" faults={value.choice === 'date' ? [] : faults}>
        <RadioGroup.Root
          aria-label="Conference"
          value={value.choice}
          onValueChange={(choice) => {
            onChange({ ...value, choice: choice as ConferenceTyped['choice'] });
          }}
        >
          <RadioGroup.Item value="notYet">No date yet</RadioGroup.Item>
          <RadioGroup.Item value="date">On a date</RadioGroup.Item>
        </RadioGroup.Root>
      </FieldGroup>
      {value.choice === 'date' && (
        <FormField
          label="Date and time"
          path={datePath}
          faults={faults.map((fault) =>
            fault.path === 'conferenceAt' ? { ...fault, path: datePath } : fault,
          )}
          hint={`On the clock of ${timeZone}`}
        >
          {(control) => (
            <TextField.Root
              {...control}
              className="date-field"
              type="datetime-local"
              value={value.at}
              onChange={(event) => {
                onChange({ ...value, at: event.target.value });
              }}
            />
          )}
        </FormField>
      )}
    </>
  );
}
