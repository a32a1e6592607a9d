import type { Finding } from '@weighhouse/shared/contracts/findings';
import { Beam } from '../../../components/marks/beam';
import { useLedger } from '../ledger/ledger-context';
import { MovingFigure } from '../ledger/moving-figure';
import { cellSentence } from '../model/cell-words';
import { cellView } from '../model/cells';
import { columnLabel } from '../model/columns';

/** A row's cells below each other, for reading: on a phone, and for whoever does not judge. */
export function CellList({ finding }: { finding: Finding }) {
  const { columns, differential, open } = useLedger();
  if (finding.enteredInError) return null;
  return (
    <ul className="cell-list" data-pending={finding.observed === null || undefined}>
      {columns.map((column) => {
        const cell = cellView(differential, finding, column.index);
        return (
          <li key={column.id}>
            <span className="cell-list-name">{columnLabel(column)}</span>
            <span className="cell-list-figure figures" aria-hidden="true">
              {cell.ownFigure && <span className="mark-diamond mark-diamond--inline" />}
              {cell.figure ? <MovingFigure share={cell.figure.share} /> : cell.sealed ? '' : '–'}
            </span>
            <span className="aside-text">{cellSentence(cell, finding)}</span>
            {cell.sealed ? (
              <span className="ledger-sealed" aria-hidden="true" />
            ) : (
              <Beam decibans={cell.decibans} ticks={cell.ticks} own={cell.own} />
            )}
            {differential.assessment && cell.figure ? (
              <button
                type="button"
                className="text-button"
                aria-label={`Why ${column.short}`}
                onClick={() => {
                  open({ kind: 'why', target: finding.id, column: column.index });
                }}
              >
                why
              </button>
            ) : (
              <span />
            )}
          </li>
        );
      })}
    </ul>
  );
}
