import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { StandingPost } from '../../../components/marks/standing-post';
import type { ShownColumn } from '../columns/arrange';
import { stuckProps } from '../columns/stuck-props';
import { standingLines, standingSentence, standingView } from '../model/standing-view';
import { useLeaderRange } from '../why-sum/use-leader-range';
import { useLedger } from './ledger-context';
import { MovingFigure } from './moving-figure';

/** The last row, always in view: where the panel stands. */
export function StandingRow({ row, shown }: { row: number; shown: readonly ShownColumn[] }) {
  const { differential, panel } = useLedger();
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
      {shown.map((one, index) => (
        <StandingCell key={one.column.id} of={one} row={row} place={index + 1} />
      ))}
    </tr>
  );
}

function StandingCell({ of, row, place }: { of: ShownColumn; row: number; place: number }) {
  const { column, folded } = of;
  const { differential } = useLedger();
  const view = standingView(differential, column.index);
  const at = { 'data-row': row, 'data-column': place, tabIndex: -1 };
  if (folded)
    return (
      <td {...at} {...stuckProps(of, 'ledger-cell ledger-folded')}>
        <FoldedShare share={view.share ?? view.own} />
        <span className="aside-text">{standingSentence(view)}</span>
      </td>
    );
  return (
    <td {...at} {...stuckProps(of, 'ledger-cell')}>
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

/** All that a folded column shows of its candidate besides the letter. */
function FoldedShare({ share }: { share: number | null }) {
  if (share === null) return null;
  const inWords = typeof naturalFrequency(share).outOf100 === 'string';
  return (
    <span className="ledger-folded-share figures" data-words={inWords || undefined}>
      <MovingFigure share={share} />
      <span className="aside-text"> of 100</span>
    </span>
  );
}
