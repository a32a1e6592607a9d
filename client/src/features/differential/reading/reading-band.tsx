import { Button } from '@radix-ui/themes';
import { useLedger } from '../ledger/ledger-context';
import { isEmptyTrial } from '../trial/trial';
import { isHeavy } from './use-assessed';
import { readingSentences } from './reading-words';
import './reading.css';

/** Says that what is on the screen is not the panel's own reading, and leads back to it. */
export function ReadingBand() {
  const { reading, saved } = useLedger();
  if (reading.panelsOwn) return null;
  const trial = !isEmptyTrial(reading.trial);
  return (
    <div className="reading-band" data-trial={trial || undefined} role="region" aria-label="What you read">
      <p>
        {trial && <b>A trial. Only you see it. </b>}
        {readingSentences(reading.coexistence, saved.settings.coexistence, trial).join(' ')} <ReadingState />
      </p>
      <div className="actions no-print">
        <Button variant="outline" onClick={reading.back}>
          {trial ? 'Drop the trial' : 'Back to the panel’s reading'}
        </Button>
      </div>
    </div>
  );
}

/** While it is not on the screen yet, or cannot be. */
function ReadingState() {
  const { reading } = useLedger();
  if (reading.state === 'shown') return null;
  if (reading.state === 'refused')
    return <b role="alert">It cannot be computed so: the numbers below are the panel’s own.</b>;
  return (
    <span role="status">
      {reading.panel && isHeavy(reading.panel)
        ? 'Computing every combination of the candidates; until then the numbers below are as they were.'
        : 'Computing.'}
    </span>
  );
}
