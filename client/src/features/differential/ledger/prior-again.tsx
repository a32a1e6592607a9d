import { Button } from '@radix-ui/themes';
import { useLedger } from './ledger-context';

/** After a change of the candidates: one's prior is asked for again. */
export function PriorAgain() {
  const { saved: differential, canJudge, open, panel } = useLedger();
  const { mine } = differential;
  if (!canJudge || !mine?.prior || mine.priorInForce || panel?.kind === 'prior') return null;
  return (
    <div className="ledger-notice" role="status">
      <p>
        The candidates have changed. Your prior belongs to the earlier set and is not pooled until you give it
        again. Your likelihoods of the other columns stay.
      </p>
      <Button
        onClick={() => {
          open({ kind: 'prior', at: null });
        }}
      >
        Give your prior again
      </Button>
    </div>
  );
}
