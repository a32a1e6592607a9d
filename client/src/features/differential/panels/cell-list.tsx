import type { Finding } from '@weighhouse/shared/contracts/findings';
import { Beam } from '../../../components/marks/beam';
import { useFewColumns } from '../cards/use-few-columns';
import { useLedger } from '../ledger/ledger-context';
import { MovingFigure } from '../ledger/moving-figure';
import { cellSentence } from '../model/cell-words';
import { cellView } from '../model/cells';
import { columnLabel } from '../model/columns';
import { isTwoLevel, levelName } from '../model/finding-words';

/** A row's cells below each other, for reading: on a phone, and for whoever does not judge. */
export function CellList({ finding }: { finding: Finding }) {
  const { differential, open } = useLedger();
  const { shown, more } = useFewColumns();
  if (finding.enteredInError) return null;
  // Of levels that are not known yet, the likeliest is shown, and that can be another for each candidate.
  const named = finding.observed === null && !isTwoLevel(finding);
  return (
    <>
      <ul className="cell-list" data-pending={finding.observed === null || undefined}>
        {shown.map((column) => {
          const cell = cellView(differential, finding, column.index);
          return (
            <li key={column.id}>
              <span className="cell-list-name">
                {columnLabel(column)}
                {cell.figure && named && (
                  <span className="cell-list-level">{levelName(finding, cell.figure.level)}</span>
                )}
              </span>
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
      {more}
    </>
  );
}
