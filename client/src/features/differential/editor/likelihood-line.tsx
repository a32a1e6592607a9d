import { type Column, columnLabel } from '../model/columns';
import { parseOutOf100 } from '../typing/parse-number';
import { NumberField } from './number-field';
import { NumberTrack } from './number-track';

interface Props {
  column: Column;
  /** What the number counts: "would show this". */
  asked: string;
  text: string;
  onChange: (text: string) => void;
  others: readonly number[];
  fault: string | null;
}

/** "If it were X, how many of 100 would show this?", for one candidate. */
export function LikelihoodLine({ column, asked, text, onChange, others, fault }: Props) {
  const typed = parseOutOf100(text);
  const faultId = `fault-${column.id}`;
  return (
    <div className="likelihood">
      <span className="likelihood-name" title={column.name} aria-hidden="true">
        {columnLabel(column)}
      </span>
      <NumberTrack
        value={typed.kind === 'number' ? typed.value : null}
        others={others}
        onChange={(value) => {
          onChange(String(value));
        }}
      />
      <NumberField
        label={`If it were ${askedName(column)}, how many of 100 ${asked}?`}
        value={text}
        onChange={onChange}
        fault={fault !== null}
        describedBy={fault === null ? undefined : faultId}
        place={column.id}
      />
      {fault !== null && (
        <p id={faultId} className="field-fault">
          {columnLabel(column)} {fault}.
        </p>
      )}
    </div>
  );
}

export const askedName = (column: Column) =>
  column.none ? 'none of these' : `${column.letter} ${column.name}`;
