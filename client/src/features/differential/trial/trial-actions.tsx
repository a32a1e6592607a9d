import { Button } from '@radix-ui/themes';
import { FailureLine } from '../../../components/failure';
import { useLedger } from '../ledger/ledger-context';
import { hasOwn, isEmptyTrial } from './trial';
import type { KeepMine } from './use-keep-mine';

/** Keeps what is one's own of a trial, or drops it. */
export function TrialActions({ mine }: { mine: KeepMine }) {
  const { reading, canJudge } = useLedger();
  const tried = !isEmptyTrial(reading.trial);
  return (
    <>
      {tried && (
        <div className="actions no-print">
          {mine.can && (
            <Button loading={mine.busy} onClick={() => void mine.keep()}>
              Keep what is mine
            </Button>
          )}
          <Button variant="outline" disabled={mine.busy} onClick={reading.back}>
            Drop the trial
          </Button>
        </div>
      )}
      {tried && hasOwn(reading.trial) && !canJudge && (
        <p className="small soft">Your numbers can’t be saved now: no round takes them from you.</p>
      )}
      <FailureLine error={mine.error} />
      <p className="small" role="status">
        {mine.said}
      </p>
    </>
  );
}
