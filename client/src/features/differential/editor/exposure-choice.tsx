import type { Exposure } from '@weighhouse/shared/contracts/judgements';
import { useId } from 'react';

const choices: { value: Exposure; label: string }[] = [
  { value: 'seldom', label: 'Seldom' },
  { value: 'sometimes', label: 'Sometimes' },
  { value: 'often', label: 'Often' },
];

interface Props {
  value: Exposure | null;
  onChange: (exposure: Exposure) => void;
  fault: string | null;
}

/** How often a contributor sees this picture. Always asked; nothing is chosen beforehand. */
export function ExposureChoice({ value, onChange, fault }: Props) {
  const id = useId();
  return (
    <fieldset className="exposure" aria-describedby={fault === null ? undefined : `${id}fault`}>
      <legend>How often do you see this picture?</legend>
      <div className="exposure-choices">
        {choices.map((choice) => (
          <label key={choice.value} data-chosen={value === choice.value || undefined}>
            <input
              type="radio"
              name={id}
              value={choice.value}
              checked={value === choice.value}
              onChange={() => {
                onChange(choice.value);
              }}
            />
            {choice.label}
          </label>
        ))}
      </div>
      {fault !== null && (
        <p id={`${id}fault`} className="field-fault">
          Please {fault}.
        </p>
      )}
    </fieldset>
  );
}
