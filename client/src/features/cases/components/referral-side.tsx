import { Button } from '@radix-ui/themes';
import type { Case } from '@weighhouse/shared/contracts/cases';
import { useState } from 'react';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { FailureLine } from '../../../components/failure';
import { fieldId } from '../../../components/faults';
import { SaveState, type Saving } from '../../../components/save-state';
import { isApiError } from '../../../lib/api';
import { useMoveCase } from '../api/move-case';

interface Props {
  of: Case;
  saving: Saving;
  /** Sends what is unsent; true when the server has everything. */
  flush: () => Promise<boolean>;
  onSubmitted: () => void;
  onWithdrawn: () => void;
}

/** Beside the form: whether it is saved, what is still missing, and handing it over. */
export function ReferralSide({ of, saving, flush, onSubmitted, onWithdrawn }: Props) {
  const move = useMoveCase(of.id);
  const [withdrawing, setWithdrawing] = useState(false);
  const [unsaved, setUnsaved] = useState(false);
  const refused = isApiError(move.error) ? move.error.fields : [];
  const missing = refused.length > 0 ? refused : of.missing;

  const submit = async () => {
    const saved = await flush();
    setUnsaved(!saved);
    if (!saved) return;
    await move.mutateAsync({ move: 'submit', body: {} });
    onSubmitted();
  };

  return (
    <aside className="referral-side" aria-label="State of this referral">
      <p className="figures soft">{of.number}</p>
      <p>
        <SaveState saving={saving} />
      </p>
      <h2>{missing.length === 0 ? 'Nothing is missing' : 'Still missing'}</h2>
      {missing.length > 0 ? (
        <ul className="missing-list">
          {missing.map(({ path, message }) => (
            <li key={path + message}>
              <a
                href={`#${fieldId(path)}`}
                onClick={(event) => {
                  event.preventDefault();
                  lead(path);
                }}
              >
                {message}
              </a>
            </li>
          ))}
        </ul>
      ) : (
        <p className="soft small">The chairs see the referral once it is submitted.</p>
      )}
      <div className="actions">
        <Button
          disabled={of.missing.length > 0 && saving.state !== 'typing'}
          loading={move.isPending}
          onClick={() => void submit().catch(() => undefined)}
        >
          Submit the referral
        </Button>
        {of.abilities.includes('case.withdraw') && (
          <Button
            variant="outline"
            color="gray"
            highContrast
            onClick={() => {
              setWithdrawing(true);
            }}
          >
            Withdraw
          </Button>
        )}
      </div>
      {unsaved && (
        <p className="failure-line">Some of it is not saved yet, so it was not submitted. It is kept here.</p>
      )}
      <FailureLine error={move.error} />
      <ConfirmDialog
        open={withdrawing}
        onOpenChange={setWithdrawing}
        title="Withdraw this case?"
        verb="Withdraw"
        danger
        wordsLabel="Why"
        onConfirm={async ({ words }) => {
          await flush();
          await move.mutateAsync({ move: 'withdraw', body: { words } });
          onWithdrawn();
        }}
      >
        It is frozen at once, and only you can still read it. This cannot be undone.
      </ConfirmDialog>
    </aside>
  );
}

/** Leads to the field a missing part belongs to; the server may name it without its ending. */
function lead(path: string): void {
  const known = path === 'history' ? 'historyHtml' : path;
  const field =
    document.getElementById(fieldId(known)) ?? document.getElementById(fieldId(known.split('.')[0] ?? known));
  field?.scrollIntoView({ block: 'center' });
  field?.focus();
}
