import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { type ReactNode, useId } from 'react';
import { faultOf, fieldId } from './faults';

/** What the control inside takes over, so that label, hint and error belong to it. */
export interface ControlProps {
  id: string;
  'aria-describedby'?: string;
  'aria-invalid'?: true;
}

interface Props {
  label: ReactNode;
  /** The path of this field in the contract, as faults name it. */
  path: string;
  faults?: readonly FieldFault[] | undefined;
  hint?: ReactNode;
  /** Told in words, because a star is not. */
  optional?: boolean;
  children: (control: ControlProps) => ReactNode;
}

/** A label, the control, a hint and the error of its path. The id follows from the path, for ErrorSummary's links. */
export function FormField({ label, path, faults, hint, optional, children }: Props) {
  const id = fieldId(path);
  const more = useId();
  const fault = faultOf(faults, path);
  const described = [hint !== undefined && `${more}hint`, fault && `${more}fault`].filter(Boolean).join(' ');
  return (
    <div className="form-field">
      <label htmlFor={id}>
        {label}
        {optional === true && <span className="soft"> (may be left out)</span>}
      </label>
      {hint !== undefined && (
        <p id={`${more}hint`} className="field-hint">
          {hint}
        </p>
      )}
      {children({
        id,
        ...(described === '' ? {} : { 'aria-describedby': described }),
        ...(fault ? { 'aria-invalid': true } : {}),
      })}
      {fault && (
        <p id={`${more}fault`} className="field-fault">
          {fault}
        </p>
      )}
    </div>
  );
}

/** A group of choices with one legend. */
export function FieldGroup({
  label,
  path,
  faults,
  hint,
  children,
}: Omit<Props, 'children' | 'optional'> & { children: ReactNode }) {
  const more = useId();
  const fault = faultOf(faults, path);
  return (
    <fieldset
      className="form-field"
      id={fieldId(path)}
      tabIndex={-1}
      aria-describedby={fault ? `${more}fault` : undefined}
    >
      <legend>{label}</legend>
      {hint !== undefined && <p className="field-hint">{hint}</p>}
      {children}
      {fault && (
        <p id={`${more}fault`} className="field-fault">
          {fault}
        </p>
      )}
    </fieldset>
  );
}
