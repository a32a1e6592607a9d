import type { Finding } from '@weighhouse/shared/contracts/findings';
import { memo } from 'react';
import { useFormat } from '../../../lib/use-format';
import type { ShownColumn } from '../columns/arrange';
import type { CellView } from '../model/cells';
import { dayWords } from '../model/day-words';
import { findingLine } from '../model/finding-words';
import { leftOutAttribute } from '../without/left-out';
import { FindingCell } from './finding-cell';
import type { Panel } from './ledger-context';

interface Props {
  finding: Finding;
  /** Where it stands in the grid. */
  row: number;
  shown: readonly ShownColumn[];
  /** By the column's index; the same object as long as nothing of the row changed. */
  cells: readonly CellView[];
  selected: boolean;
  unsaved: boolean;
  /** What is tried on it, in words; null where nothing is. */
  tried: string | null;
  /** The ids of the columns in which one's own number is tried. */
  triedColumns: readonly string[];
  /** The chair wants it discussed first. */
  onAgenda: boolean;
  /** Of the pending findings it is the one that would settle most. */
  settlesMost: boolean;
  why: ((panel: Panel) => void) | null;
}

/** One finding across the candidates. Drawn anew only where something of this row changed. */
export const FindingRow = memo(function FindingRow(props: Props) {
  const { finding, row, shown, cells, selected, unsaved, tried, triedColumns, onAgenda, settlesMost, why } =
    props;
  const format = useFormat();
  const state = finding.enteredInError ? 'error' : finding.observed === null ? 'pending' : 'observed';
  return (
    <tr className="ledger-row" data-state={state} aria-selected={selected}>
      <th
        scope="row"
        className="ledger-title"
        data-row={row}
        data-column={0}
        data-tried={tried !== null || undefined}
        data-without={leftOutAttribute({ kind: 'finding', id: finding.id })}
        tabIndex={-1}
      >
        <span className="ledger-name">{finding.title}</span>
        <span className="ledger-line">
          {unsaved && <b className="ledger-unsaved">Typed, not saved.</b>}
          {tried !== null && <b className="ledger-tried">{tried}</b>}
          {onAgenda && <b className="ledger-agenda">Discuss first.</b>}
          {findingLine(finding, dayWords(format))}
          {settlesMost && '. Would settle most'}
        </span>
      </th>
      {shown.map((one, index) => {
        const cell = cells[one.column.index];
        return (
          cell && (
            <FindingCell
              key={one.column.id}
              finding={finding}
              of={one}
              row={row}
              place={index + 1}
              cell={cell}
              tried={triedColumns.includes(one.column.id)}
              why={why}
            />
          )
        );
      })}
    </tr>
  );
});
