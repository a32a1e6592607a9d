import { useId } from 'react';
import { SelectBox } from '../../../components/select-box';
import { useLedger } from '../ledger/ledger-context';
import { SideHeading } from '../panels/side-panel';
import { TrialActions } from './trial-actions';
import { type TrialChange, trialChanges } from './trial-changes';
import { TrialPrior } from './trial-prior';
import { TrialRowForm } from './trial-row-form';
import { useKeepMine } from './use-keep-mine';
import { TrialSettings } from './trial-settings';

/** What if: other numbers, which only oneself sees. With a finding: what is tried on it stands open. */
export function TrialPanel({ findingId }: { findingId: string | null }) {
  const { saved, rows, columns, reading, open } = useLedger();
  const id = useId();
  const mine = useKeepMine();
  const changes = trialChanges(reading.trial, saved, columns);
  const finding = saved.findings.find((one) => one.id === findingId && !one.enteredInError);
  return (
    <>
      <SideHeading>What if</SideHeading>
      <p className="side-about">
        Try other numbers. It is a trial that only you see: the panel keeps its own, and nothing is saved
        before you keep it.
      </p>
      <Changes changes={changes} />
      <TrialActions mine={mine} />
      <h3 className="side-sub">A finding</h3>
      <label htmlFor={id} className="aside-text">
        Finding to try
      </label>
      <SelectBox
        id={id}
        value={finding?.id ?? ''}
        onChange={(event) => {
          const { value } = event.target;
          open({ kind: 'trial', findingId: value === '' ? null : value });
        }}
      >
        <option value="">Choose a finding</option>
        {rows
          .filter((row) => !row.enteredInError)
          .map((row) => (
            <option key={row.id} value={row.id}>
              {row.title}
            </option>
          ))}
      </SelectBox>
      {finding && <TrialRowForm key={finding.id} finding={finding} />}
      {saved.mine && (
        <details className="tried-part">
          <summary>Your prior</summary>
          <TrialPrior />
        </details>
      )}
      <h3 className="side-sub">How the findings count</h3>
      <TrialSettings />
    </>
  );
}

function Changes({ changes }: { changes: readonly TrialChange[] }) {
  const { reading } = useLedger();
  if (changes.length === 0) return <p className="soft">Nothing is tried yet.</p>;
  return (
    <ul className="tried-list" aria-label="What is tried">
      {changes.map(({ key, sentence, own, undone }) => (
        <li key={key}>
          <span>
            {sentence}
            {own ? '' : ' (not yours to keep)'}.
          </span>
          <button
            type="button"
            className="text-button"
            aria-label={`Take back: ${sentence}`}
            onClick={() => {
              reading.tryOut(undone);
            }}
          >
            Take back
          </button>
        </li>
      ))}
    </ul>
  );
}
