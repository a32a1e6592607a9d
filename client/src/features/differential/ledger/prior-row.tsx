import { ShareBar } from '../../../components/marks/share-bar';
import type { ShownColumn } from '../columns/arrange';
import { stuckProps } from '../columns/stuck-props';
import { priorSentence, priorView } from '../model/prior-view';
import { useLedger } from './ledger-context';
import { MovingFigure } from './moving-figure';

/** The first row: what the panel starts from. */
export function PriorRow({ shown }: { shown: readonly ShownColumn[] }) {
  const { panel, unsaved, differential, reading } = useLedger();
  const tried = reading.trial.prior !== null;
  const selected = panel?.kind === 'prior' || (panel?.kind === 'why' && panel.target === 'prior');
  return (
    <tr className="ledger-row ledger-row--prior" aria-selected={selected}>
      <th
        scope="row"
        className="ledger-title"
        data-row={0}
        data-column={0}
        data-tried={tried || undefined}
        tabIndex={-1}
      >
        <span className="ledger-name">Before any finding</span>
        <span className="ledger-line">
          {unsaved.has('prior') && <b className="ledger-unsaved">Typed, not saved.</b>}
          {tried && <b className="ledger-tried">Trial: your prior.</b>}
          {priorLine(differential)}
        </span>
      </th>
      {shown.map((one, index) => (
        <PriorCell key={one.column.id} of={one} place={index + 1} />
      ))}
    </tr>
  );
}

function priorLine({ assessment, sealed, mine }: ReturnType<typeof useLedger>['differential']): string {
  if (assessment)
    return assessment.priorGiven ? 'Starting shares, pooled' : 'Nobody gave a prior: all start alike';
  return sealed && mine ? 'Starting shares, yours' : 'Starting shares';
}

function PriorCell({ of, place }: { of: ShownColumn; place: number }) {
  const { column, folded } = of;
  const { differential } = useLedger();
  const view = priorView(differential, column.index);
  const at = { 'data-row': 0, 'data-column': place, tabIndex: -1 };
  if (folded)
    return (
      <td {...at} {...stuckProps(of, 'ledger-cell ledger-folded')}>
        <span className="aside-text">Folded. {priorSentence(view)}</span>
      </td>
    );
  return (
    <td {...at} {...stuckProps(of, 'ledger-cell')}>
      <span className="aside-text">{priorSentence(view)}</span>
      <span className="ledger-figure" aria-hidden="true">
        {view.ownShare && <span className="mark-diamond mark-diamond--inline" />}
        <span className="figures">{view.share !== null && <MovingFigure share={view.share} />}</span>
      </span>
      {view.sealed ? (
        <span className="ledger-sealed" aria-hidden="true" />
      ) : (
        <ShareBar
          share={view.ownShare ? null : view.share}
          ticks={view.ticks}
          own={view.own}
          none={column.none}
        />
      )}
    </td>
  );
}
