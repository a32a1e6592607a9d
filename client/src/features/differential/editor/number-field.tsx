import type { KeyboardEvent } from 'react';

interface Props {
  label: string;
  value: string;
  onChange: (text: string) => void;
  fault?: boolean | undefined;
  describedBy?: string | undefined;
  /** Where typing in the ledger finds it. */
  place: string;
}

/** A small field for a number out of 100. Up and Down go to the field above and below. */
export function NumberField({ label, value, onChange, fault, describedBy, place }: Props) {
  return (
    <input
      className="number-field figures"
      type="text"
      inputMode="decimal"
      autoComplete="off"
      maxLength={12}
      aria-label={label}
      aria-invalid={fault === true ? true : undefined}
      aria-describedby={describedBy}
      data-field={place}
      value={value}
      onChange={(event) => {
        onChange(event.target.value);
      }}
      onKeyDown={moveBetweenFields}
    />
  );
}

function moveBetweenFields(event: KeyboardEvent<HTMLInputElement>): void {
  const step = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
  if (step === 0) return;
  const fields = [...(event.currentTarget.form?.querySelectorAll<HTMLInputElement>('[data-field]') ?? [])];
  const next = fields[fields.indexOf(event.currentTarget) + step];
  event.preventDefault();
  next?.focus();
  next?.select();
}
