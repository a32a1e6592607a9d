import { Button, TextField } from '@radix-ui/themes';
import { FieldGroup, FormField } from '../../../components/form-field';
import { capital } from '../../../lib/words';
import type { FieldsProps } from './finding-fields';

const most = 6;

/** What is known: present, absent, a level, or not known yet with what finding out would take. */
export function StateFields({ values, set, faults }: FieldsProps) {
  const levels = values.ownLevels ? values.levelLabels : ['absent', 'present'];
  const choices = levels
    .map((label, index) => ({ value: String(index), label: capital(label.trim()) }))
    .filter((choice) => choice.label !== '');
  const shown = values.ownLevels ? choices : choices.toReversed();
  return (
    <>
      {values.ownLevels && <LevelFields values={values} set={set} faults={faults} />}
      <FieldGroup label="What is known" path="observed" faults={faults}>
        {[...shown, { value: 'pending', label: 'Not known yet' }].map((choice) => (
          <label key={choice.value} className="check-line">
            <input
              type="radio"
              name="observed"
              checked={values.observed === choice.value}
              onChange={() => {
                set({ observed: choice.value });
              }}
            />
            {choice.label}
          </label>
        ))}
        <button
          type="button"
          className="text-button"
          onClick={() => {
            set({ ownLevels: !values.ownLevels, observed: values.observed === 'pending' ? 'pending' : '' });
          }}
        >
          {values.ownLevels ? 'Only present or absent' : 'It has more than two levels'}
        </button>
      </FieldGroup>
      {values.observed === 'pending' && <EffortFields values={values} set={set} faults={faults} />}
    </>
  );
}

function LevelFields({ values, set, faults }: FieldsProps) {
  const setLabel = (index: number, label: string) => {
    set({ levelLabels: values.levelLabels.map((known, at) => (at === index ? label : known)) });
  };
  return (
    <FieldGroup
      label="Levels"
      path="levelLabels"
      faults={faults}
      hint="Two to six, of which exactly one is so, in order from least to most where there is an order. A field left blank is no level."
    >
      {values.levelLabels.map((label, index) => (
        <TextField.Root
          key={index}
          aria-label={`Level ${String(index + 1)}`}
          maxLength={80}
          value={label}
          onChange={(event) => {
            setLabel(index, event.target.value);
          }}
        />
      ))}
      {values.levelLabels.length < most && (
        <Button
          type="button"
          variant="outline"
          onClick={() => {
            set({ levelLabels: [...values.levelLabels, ''] });
          }}
        >
          One more level
        </Button>
      )}
    </FieldGroup>
  );
}

const efforts = [
  { path: 'cost', label: 'Cost', hint: 'In your currency.' },
  { path: 'waitDays', label: 'Wait', hint: 'In days until the result.' },
  { path: 'burden', label: 'Burden', hint: 'For the patient: 0 none, 1 little, 2 some, 3 much.' },
] as const;

function EffortFields({ values, set, faults }: FieldsProps) {
  return efforts.map(({ path, label, hint }) => (
    <FormField key={path} label={label} path={path} faults={faults} hint={hint} optional>
      {(control) => (
        <TextField.Root
          {...control}
          inputMode="decimal"
          maxLength={12}
          value={values[path]}
          onChange={(event) => {
            set({ [path]: event.target.value });
          }}
        />
      )}
    </FormField>
  ));
}
