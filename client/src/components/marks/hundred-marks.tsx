import type { NaturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { hundredOf, placeOf } from './hundred';
import './hundred.css';

interface Props {
  /** The whole number of the words beside it. */
  outOf100: NaturalFrequency['outOf100'];
  /** What the words say, for whoever does not see the picture: "61 of 100 like this". */
  label: string;
  /** The column none of these is slate. */
  none?: boolean;
}

/** A weight as it stands on a scale, and the ring where none stands: told apart by shape, so that no colour is needed. */
const weight = 'l1.2-6.4h4.6l1.2 6.4z';
const lowerPart = 'l.45-2.4h6.1l.45 2.4z';
const ring = 'm-1.5 0a1.5 1.5 0 1 0 3 0a1.5 1.5 0 1 0-3 0z';

/** A number of a hundred patients, each of them a small mark, ten to a row. */
export function HundredMarks({ outOf100, label, none = false }: Props) {
  const { whole, part } = hundredOf(outOf100);
  const at = (mark: number, right: number, down: number, shape: string) => {
    const { row, column } = placeOf(mark);
    return `M${String(column * 10 + right)} ${String(row * 10 + down)}${shape}`;
  };
  const marks = Array.from({ length: 100 }, (_, mark) => mark);
  return (
    <svg
      className="hundred"
      data-none={none || undefined}
      role="img"
      aria-label={label}
      viewBox="0 0 100 100"
      data-whole={whole}
    >
      <path
        className="hundred-empty"
        d={marks
          .slice(whole + part)
          .map((mark) => at(mark, 5, 5.4, ring))
          .join('')}
      />
      <path
        className="hundred-whole"
        d={marks
          .slice(0, whole)
          .map((mark) => at(mark, 1.5, 8.4, weight))
          .join('')}
      />
      {part === 1 && (
        <>
          <path className="hundred-outline" d={at(whole, 1.5, 8.4, weight)} />
          <path className="hundred-whole" d={at(whole, 1.5, 8.4, lowerPart)} />
        </>
      )}
    </svg>
  );
}
