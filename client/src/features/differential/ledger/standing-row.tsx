import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { StandingPost } from '../../../components/marks/standing-post';
import type { ShownColumn } from '../columns/arrange';
import { stuckProps } from '../columns/stuck-props';
import { standingLines, standingSentence, standingView } from '../model/standing-view';
import { CombinationsButton } from '../coexistence/combinations-button';
import { useLeaderRange } from '../why-sum/use-leader-range';
import { useWithout } from '../without/without-context';
import { useLedger } from './ledger-context';
import { MovingFigure } from './moving-figure';

/** The last row, always in view: where the panel stands. */
export function StandingRow({ row, shown }: { row: number; shown: readonly ShownColumn[] }) {
  const { differential, panel, reading } = useLedger();
  const range = useLeaderRange();
  const without = useWithout();
  return (
    <tr className="ledger-standing" aria-selected={panel?.kind === 'why' && panel.target === 'standing'}>
      <th scope="row" className="ledger-title" data-row={row} data-column={0} tabIndex={-1}>
        <span className="ledger-name">
          {reading.panelsOwn ? 'Where the panel stands' : 'Where the panel would stand'}
        </span>
        {/* What is covered keeps its room: a row that changed its height would move what is pointed at. */}
        <span className="standing-lines" data-covered={without !== null || undefined}>
          {standingLines(differential).map((line) => (
            <span key={line} className="ledger-line">
              {line}
            </span>
          ))}
          {range !== null && <span className="ledger-line">{range}</span>}
          <CombinationsButton />
        </span>
        {without && (
          <span className="standing-without-said">
            {without.sentence} The dashed line is the standing without it.
          </span>
        )}
      </th>
      {shown.map((one, index) => (
        <StandingCell key={one.column.id} of={one} row={row} place={index + 1} />
      ))}
    </tr>
  );
}

function StandingCell({ of, row, place }: { of: ShownColumn; row: number; place: number }) {
  const { column, folded } = of;
  const { differential, saved, reading } = useLedger();
  const panels = reading.panelsOwn ? null : (saved.assessment?.standing[column.index] ?? null);
  const view = standingView(differential, column.index);
  const without = useWithout()?.standing?.[column.index] ?? null;
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
      <StandingPost {...view} without={without} none={column.none} />
      {view.share !== null && (
        <span
          className="standing-big figures"
          data-words={typeof naturalFrequency(view.share).outOf100 === 'string' || undefined}
        >
          <MovingFigure share={view.share} percent />
        </span>
      )}
      <span className="standing-words" data-covered={without !== null || undefined}>
        <span className="standing-like">
          {view.share !== null && `${naturalFrequency(view.share).words} like this`}
          {view.share === null && view.own !== null && `you: ${naturalFrequency(view.own).words}`}
        </span>
        {panels !== null && (
          <span className="standing-like">the panel: {naturalFrequency(panels).outOf100}</span>
        )}
        {without !== null && (
          <span className="standing-without">{naturalFrequency(without).words} without</span>
        )}
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
