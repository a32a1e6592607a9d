import type { Finding } from '@weighhouse/shared/contracts/findings';
import { Beam } from '../../../components/marks/beam';
import { cellSentence } from '../model/cell-words';
import { cellView } from '../model/cells';
import type { Column } from '../model/columns';
import { isTwoLevel, levelName } from '../model/finding-words';
import { useLedger } from './ledger-context';
import { MovingFigure } from './moving-figure';

/** What one finding says about one candidate: the figure, and the beam of its weight of evidence. */
export function FindingCell({ finding, column, row }: { finding: Finding; column: Column; row: number }) {
  const { differential, open } = useLedger();
  const cell = cellView(differential, finding, column.index);
  const named = cell.figure && !isTwoLevel(finding) && finding.observed === null;
  return (
    <td
      className="ledger-cell"
      data-row={row}
      data-column={column.index + 1}
      data-unjudged={cell.unjudged === 'no' ? undefined : cell.unjudged}
      tabIndex={-1}
    >
      <span className="aside-text">{cellSentence(cell, finding)}</span>
      <span className="ledger-figure" aria-hidden="true">
        {cell.ownFigure && <span className="mark-diamond mark-diamond--inline" />}
        <span className="figures">{cell.figure && <MovingFigure share={cell.figure.share} />}</span>
        {cell.unjudged === 'cell' && <span className="ledger-level">assumed</span>}
        {cell.figure && named && cell.unjudged === 'no' && (
          <span className="ledger-level">{levelName(finding, cell.figure.level)}</span>
        )}
      </span>
      {cell.sealed && <span className="ledger-sealed" aria-hidden="true" />}
      {!cell.sealed && (cell.decibans !== null || cell.ticks.length > 0) && (
        <Beam decibans={cell.decibans} ticks={cell.ticks} own={cell.own} />
      )}
      {differential.assessment && cell.figure && (
        <button
          type="button"
          className="ledger-why"
          tabIndex={-1}
          aria-label={`Why ${column.short}, ${finding.title}`}
          onClick={() => {
            open({ kind: 'why', target: finding.id, column: column.index });
          }}
        >
          why
        </button>
      )}
    </td>
  );
}
