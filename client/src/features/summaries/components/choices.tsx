import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { useId } from 'react';
import { FieldGroup } from '../../../components/form-field';

interface Props {
  label: string;
  path: string;
  faults: readonly FieldFault[];
  /** Value and words, in order. */
  choices: Readonly<Record<string, string>>;
  value: string;
  onChange: (value: string) => void;
}

/** One of a few, in a row; nothing is chosen before somebody chooses. */
export function Choices({ label, path, faults, choices, value, onChange }: Props) {
  const name = useId();
  return (
    <FieldGroup label={label} path={path} faults={faults}>
      <div className="choices">
        {Object.entries(choices).map(([key, words]) => (
          <label key={key}>
            <input
              type="radio"
              name={name}
              checked={value === key}
              onChange={() => {
                onChange(key);
              }}
            />
            {words}
          </label>
        ))}
      </div>
    </FieldGroup>
  );
}
