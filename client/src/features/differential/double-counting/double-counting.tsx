import { Button } from '@radix-ui/themes';
import { useMemo } from 'react';
import { FailureLine } from '../../../components/failure';
import { counted } from '../../../lib/words';
import { useSignedIn } from '../../people/api/get-me';
import { useLedger } from '../ledger/ledger-context';
import { useDismissed } from './dismissed';
import { startingOverlap, useGroupTogether } from './use-group-together';
import { type Warning, warningsOf, warningWords } from './warnings';
import './double-counting.css';

/** Asks calmly about findings that may count twice: under the ledger, and where the groups are. */
export function DoubleCounting() {
  const { saved } = useLedger();
  const me = useSignedIn();
  const { isDismissed, dismiss, dismissed, showAgain } = useDismissed(me.id, saved.caseId);
  const warnings = useMemo(() => warningsOf(saved), [saved]);
  const open = warnings.filter(({ key }) => !isDismissed(key));
  const away = warnings.length - open.length;
  if (warnings.length === 0) return null;
  return (
    <section className="twice no-print" aria-label="What may count twice">
      {open.map((warning) => (
        <Question
          key={warning.key}
          warning={warning}
          onDismiss={() => {
            dismiss(warning.key);
          }}
        />
      ))}
      {dismissed > 0 && away > 0 && (
        <button type="button" className="text-button small" onClick={showAgain}>
          Show {counted(away, 'question')} about counting twice that you put away
        </button>
      )}
    </section>
  );
}

function Question({ warning, onDismiss }: { warning: Warning; onDismiss: () => void }) {
  const { saved, may, open } = useLedger();
  const group = useGroupTogether(saved.caseId, saved.settings.groups);
  const known = saved.settings.groups.find(({ id }) => id === warning.groupId);
  const mayGroup = may('settings.change') && may('finding.change');
  return (
    <div className="twice-question">
      <p>{warningWords(warning)}</p>
      <ul>
        {warning.findings.map(({ id, title }) => (
          <li key={id}>
            <button
              type="button"
              className="text-button"
              onClick={() => {
                open({ kind: 'row', findingId: id, at: null });
              }}
            >
              {title}
            </button>
          </li>
        ))}
      </ul>
      <div className="actions">
        {mayGroup && (
          <Button
            variant="outline"
            loading={group.isPending}
            onClick={() => {
              group.mutate(warning);
            }}
          >
            {known
              ? `Put all into “${known.label}”`
              : `Group them, overlap ${String(startingOverlap * 100)} of 100`}
          </Button>
        )}
        <Button variant="ghost" className="twice-away" onClick={onDismiss}>
          No, put away for me
        </Button>
      </div>
      <FailureLine error={group.error} />
    </div>
  );
}
