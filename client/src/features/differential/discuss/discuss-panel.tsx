import { leaderOf } from '@weighhouse/shared/reasoning/leader';
import { useState } from 'react';
import { counted } from '../../../lib/words';
import { useLedger } from '../ledger/ledger-context';
import { SideHeading } from '../panels/side-panel';
import { DiscussLine } from './discuss-line';
import { discussRows } from './discuss-rows';
import './discuss.css';

/** How many rows are shown before the rest is asked for. */
const first = 8;

/** What the panel should talk about before the rest: the chair's agenda, then the rows on which most depends. */
export function DiscussPanel() {
  const { differential, columns } = useLedger();
  const [all, setAll] = useState(false);
  const { assessment, sealed, shownRound } = differential;
  const { agenda, others } = discussRows(differential);
  const leader = assessment ? columns[leaderOf(assessment.standing)] : undefined;
  const shown = all ? others : others.slice(0, first);
  return (
    <div className="discuss">
      <SideHeading>Discuss first</SideHeading>
      {sealed && shownRound && (
        <p className="side-about">As round {shownRound.number} left it. The open round is sealed.</p>
      )}
      <h3 className="side-sub">{agenda.length === 0 ? 'The agenda is empty' : 'On the agenda'}</h3>
      {agenda.length > 0 && (
        <ol className="discuss-list">
          {agenda.map((row) => (
            <DiscussLine key={row.finding.id} row={row} leader={leader} />
          ))}
        </ol>
      )}
      <h3 className="side-sub">Where most depends on whose numbers are taken</h3>
      {!assessment ? (
        <p className="soft">
          {sealed
            ? 'Sealed: who is apart is told to nobody before the chair unseals the round.'
            : 'Nothing is judged yet.'}
        </p>
      ) : others.length === 0 ? (
        <p className="soft">Nobody is apart on any other row.</p>
      ) : (
        <ol className="discuss-list">
          {shown.map((row) => (
            <DiscussLine key={row.finding.id} row={row} leader={leader} />
          ))}
        </ol>
      )}
      {assessment && others.length > first && (
        <button
          type="button"
          className="text-button no-print"
          aria-expanded={all}
          onClick={() => {
            setAll(!all);
          }}
        >
          {all ? 'Only the first' : `And ${counted(others.length - first, 'other row')}`}
        </button>
      )}
    </div>
  );
}
