import { FailureLine } from '../../../components/failure';
import { isApiError } from '../../../lib/api-error';
import { useLedger } from '../ledger/ledger-context';
import type { Draft } from '../typing/draft';

/** Why a save did not go through, and what a change of the candidates meanwhile means for what is typed. */
export function ChangedMeanwhile({ error, draft }: { error: unknown; draft: Draft | null }) {
  const { differential } = useLedger();
  if (draft && draft.candidateSet !== differential.candidateSet)
    return (
      <p className="note" role="alert">
        The candidates changed after you began to type. Your numbers stayed with their candidates, and a new
        candidate is blank. Check them and save.
      </p>
    );
  if (isApiError(error, 'stale'))
    return (
      <p className="note" role="alert">
        Your judgement was saved somewhere else meanwhile, or the candidates changed. What you typed is still
        here. Check it and save again.
      </p>
    );
  return <FailureLine error={error} />;
}
