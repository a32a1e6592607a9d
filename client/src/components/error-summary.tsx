import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { useEffect, useRef } from 'react';
import { fieldId } from './faults';

interface Props {
  faults: readonly FieldFault[];
  /** Names of the fields by path; a fault elsewhere is shown with its message alone. */
  labels: Readonly<Record<string, string>>;
  title?: string;
}

function labelOf(path: string, labels: Props['labels']): [string, string] | null {
  const known = Object.keys(labels).find((key) => path === key || path.startsWith(`${key}.`));
  return known === undefined ? null : [known, labels[known] ?? known];
}

/** Every fault of a form in one list that takes the focus when it appears; each line leads to its field. */
export function ErrorSummary({ faults, labels, title = 'This could not be sent yet' }: Props) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (faults.length > 0) box.current?.focus();
  }, [faults]);
  if (faults.length === 0) return null;
  return (
    <div ref={box} className="error-summary" tabIndex={-1} role="group" aria-label={title}>
      <p className="failure-title">{title}</p>
      <ul>
        {faults.map((fault) => {
          const field = labelOf(fault.path, labels);
          return (
            <li key={`${fault.path} ${fault.message}`}>
              {field ? (
                <a
                  href={`#${fieldId(field[0])}`}
                  onClick={(event) => {
                    event.preventDefault();
                    document.getElementById(fieldId(field[0]))?.focus();
                  }}
                >
                  {field[1]}: {fault.message}
                </a>
              ) : (
                fault.message
              )}
            </li>
          );
        })}
      </ul>
    </div>
  );
}
