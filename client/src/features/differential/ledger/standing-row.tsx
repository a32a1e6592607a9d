import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { StandingPost } from '../../../components/marks/standing-post';
import type { Column } from '../model/columns';
import { standingLines, standingSentence, standingView } from '../model/standing-view';
import { useLeaderRange } from '../why-sum/use-leader-range';
import { useLedger } from './ledger-context';
import { MovingFigure } from './moving-figure';

/** The last row, always in view: where the panel stands. */
export function StandingRow({ row }: { row: number }) {
  const { columns, differential, panel } = useLedger();
  const range = useLeaderRange();
  return (
    <tr className="ledger-standing" aria-selected={panel?.kind === 'why' && panel.target === 'standing'}>
      <th scope="row" className="ledger-title" data-row={row} data-column={0} tabIndex={-1}>
        <span className="ledger-name">Where the panel stands</span>
        {standingLines(differential).map((line) => (
          <span key={line} className="ledger-line">
            {line}
          </span>
        ))}
        {range !== null && <span className="ledger-line">{range}</span>}
      </th>
      {columns.map((column) => (
        <StandingCell key={column.id} column={column} row={row} />
      ))}
    </tr>
  );
}

function StandingCell({ column, row }: { column: Column; row: number }) {
  const { differential } = useLedger();
  const view = standingView(differential, column.index);
  return (
    <td className="ledger-cell" data-row={row} data-column={column.index + 1} tabIndex={-1}>
      <StandingPost {...view} none={column.none} />
      {view.share !== null && (
        <span
          className="standing-big figures"
          data-words={typeof naturalFrequency(view.share).outOf100 === 'string' || undefined}
        >
          <MovingFigure share={view.share} percent />
        </span>
      )}
      <span className="standing-like">
        {view.share !== null && `${naturalFrequency(view.share).words} like this`}
        {view.share === null && view.own !== null && `you: ${naturalFrequency(view.own).words}`}
      </span>
      <span className="aside-text">{standingSentence(view)}</span>
    </td>
  );
}
