import type { Finding } from '@weighhouse/shared/contracts/findings';
import { Beam } from '../../../components/marks/beam';
import type { ShownColumn } from '../columns/arrange';
import { stuckProps } from '../columns/stuck-props';
import { cellSentence } from '../model/cell-words';
import type { CellView } from '../model/cells';
import { isTwoLevel, levelName } from '../model/finding-words';
import type { Panel } from './ledger-context';
import { MovingFigure } from './moving-figure';

interface Props {
  finding: Finding;
  of: ShownColumn;
  /** Where it stands in the grid. */
  row: number;
  place: number;
  cell: CellView;
  /** One's own number of it is tried. */
  tried: boolean;
  /** The way to how the number came about; null where there is none to tell. */
  why: ((panel: Panel) => void) | null;
}

/** What one finding says about one candidate: the figure, and the beam of its weight of evidence. */
export function FindingCell({ finding, of, row, place, cell, tried, why }: Props) {
  const { column, folded } = of;
  const named = cell.figure && !isTwoLevel(finding) && finding.observed === null;
  const at = { 'data-row': row, 'data-column': place, tabIndex: -1 };
  if (folded)
    return (
      <td {...at} {...stuckProps(of, 'ledger-cell ledger-folded')}>
        <span className="aside-text">Folded. {cellSentence(cell, finding)}</span>
      </td>
    );
  return (
    <td
      {...at}
      {...stuckProps(of, 'ledger-cell')}
      data-tried={tried || undefined}
      data-unjudged={cell.unjudged === 'no' ? undefined : cell.unjudged}
    >
      <span className="aside-text">
        {tried && 'Your number is a trial. '}
        {cellSentence(cell, finding)}
      </span>
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
      {why && cell.figure && (
        <button
          type="button"
          className="ledger-why"
          tabIndex={-1}
          aria-label={`Why ${column.short}, ${finding.title}`}
          onClick={() => {
            why({ kind: 'why', target: finding.id, column: column.index });
          }}
        >
          why
        </button>
      )}
    </td>
  );
}
