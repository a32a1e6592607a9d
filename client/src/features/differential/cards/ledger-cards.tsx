import { Button } from '@radix-ui/themes';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { useState } from 'react';
import { ShareBar } from '../../../components/marks/share-bar';
import { useFormat } from '../../../lib/use-format';
import { useLedger } from '../ledger/ledger-context';
import { MovingFigure } from '../ledger/moving-figure';
import { columnLabel } from '../model/columns';
import { dayWords } from '../model/day-words';
import { findingLine } from '../model/finding-words';
import { priorSentence, priorView } from '../model/prior-view';
import { rowGroups } from '../model/rows';
import { WithoutButton } from '../without/without-button';
import { CellList } from '../panels/cell-list';
import { CompactStanding } from './compact-standing';
import { useFewColumns } from './use-few-columns';

/** The ledger on a phone: the prior, then one finding a screen, and where the panel stands always below. */
export function LedgerCards() {
  const { rows } = useLedger();
  const [index, setIndex] = useState(0);
  const at = Math.min(index, rows.length);
  const finding = rows[at - 1];
  return (
    <div className="cards">
      <div className="cards-steps">
        <Button
          variant="outline"
          disabled={at === 0}
          onClick={() => {
            setIndex(at - 1);
          }}
        >
          Previous
        </Button>
        <span className="small soft" role="status">
          {at === 0
            ? `Prior, before ${String(rows.length)} findings`
            : `Finding ${String(at)} of ${String(rows.length)}`}
        </span>
        <Button
          variant="outline"
          disabled={at === rows.length}
          onClick={() => {
            setIndex(at + 1);
          }}
        >
          Next
        </Button>
      </div>
      {finding ? <FindingCard finding={finding} /> : <PriorCard />}
      <CompactStanding />
    </div>
  );
}

function FindingCard({ finding }: { finding: Finding }) {
  const { differential, canJudge, open, unsaved } = useLedger();
  const format = useFormat();
  const group = rowGroups(differential.findings).find((one) => one.rows.some((row) => row.id === finding.id));
  const struck = finding.enteredInError !== null;
  return (
    <article className="card" data-state={struck ? 'error' : undefined}>
      <p className="small soft">{group?.title}</p>
      <h2 className="ledger-name">{finding.title}</h2>
      <p className="small soft">
        {unsaved.has(finding.id) && <b className="ledger-unsaved">Typed, not saved.</b>}
        {differential.agenda.some((item) => item.findingId === finding.id) && (
          <b className="ledger-agenda">Discuss first.</b>
        )}
        {findingLine(finding, dayWords(format))}
      </p>
      <CellList finding={finding} />
      <WithoutButton left={{ kind: 'finding', id: finding.id }} name={`“${finding.title}”`} />
      <Button
        variant={canJudge && !struck ? 'solid' : 'outline'}
        onClick={() => {
          open({ kind: 'row', findingId: finding.id, at: null });
        }}
      >
        {canJudge && !struck ? 'Judge this row' : 'Open this row'}
      </Button>
    </article>
  );
}

function PriorCard() {
  const { differential, canJudge, open } = useLedger();
  const { shown, more } = useFewColumns();
  return (
    <article className="card">
      <h2 className="ledger-name">Before any finding</h2>
      <ul className="cell-list">
        {shown.map((column) => {
          const view = priorView(differential, column.index);
          return (
            <li key={column.id}>
              <span className="cell-list-name">{columnLabel(column)}</span>
              <span className="cell-list-figure figures" aria-hidden="true">
                {view.share === null ? view.sealed ? '' : '–' : <MovingFigure share={view.share} />}
              </span>
              <span className="aside-text">{priorSentence(view)}</span>
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
              <span />
            </li>
          );
        })}
      </ul>
      {more}
      {canJudge && (
        <Button
          variant="outline"
          onClick={() => {
            open({ kind: 'prior', at: null });
          }}
        >
          Change your prior
        </Button>
      )}
    </article>
  );
}
