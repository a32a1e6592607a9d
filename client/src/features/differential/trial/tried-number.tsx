import { useId, useState } from 'react';
import { numberText } from '../typing/parse-number';

interface Props {
  label: string;
  /** Out of 100, as it is saved. */
  saved: number;
  /** Out of 100; null while nothing else is tried. */
  tried: number | null;
  low: number;
  high: number;
  /** Undefined goes back to what is saved. */
  onTry: (value: number | undefined) => void;
}

/** One number out of 100 that can be tried; while another one stands there, what is saved stands beside it. */
export function TriedNumber({ label, saved, tried, low, high, onTry }: Props) {
  const id = useId();
  const [typed, setTyped] = useState<string | null>(null);
  const fault = typed !== null && readBetween(typed, low, high) === null;
  return (
    <div className="tried-line" data-tried={tried !== null || undefined}>
      <label htmlFor={id}>{label}</label>
      <input
        id={id}
        className="number-field figures"
        inputMode="decimal"
        maxLength={5}
        aria-invalid={fault || undefined}
        aria-describedby={`${id}more`}
        value={typed ?? numberText(tried ?? saved)}
        onChange={(event) => {
          const text = event.target.value;
          setTyped(text);
          const value = readBetween(text, low, high);
          if (value !== null) onTry(Math.abs(value - saved) < 1e-9 ? undefined : value);
        }}
        onBlur={() => {
          if (!fault) setTyped(null);
        }}
      />
      <span id={`${id}more`} className={fault ? 'field-fault' : 'small soft'}>
        {fault
          ? `Must be from ${String(low)} to ${String(high)}.`
          : tried === null
            ? ''
            : `Trial. Saved: ${numberText(saved)}.`}
      </span>
    </div>
  );
}

/** @returns null for anything but a number between the two */
function readBetween(text: string, low: number, high: number): number | null {
  const typed = text.trim().replace(',', '.');
  if (!/^\d+(\.\d*)?$/.test(typed)) return null;
  const value = Number(typed);
  return value >= low && value <= high ? Math.round(value * 10) / 10 : null;
}
