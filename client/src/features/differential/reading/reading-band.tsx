import { Button } from '@radix-ui/themes';
import { counted } from '../../../lib/words';
import { useLedger } from '../ledger/ledger-context';
import { isEmptyTrial } from '../trial/trial';
import { TrialActions } from '../trial/trial-actions';
import { trialChanges } from '../trial/trial-changes';
import { useKeepMine } from '../trial/use-keep-mine';
import { readingSentences } from './reading-words';
import './reading.css';

/** So many changes are said in the band; all of them stand at the side. */
const mostSaid = 3;

/** Says that what is on the screen is not the panel's own reading, and leads back to it. */
export function ReadingBand() {
  const { reading, saved } = useLedger();
  const trial = !isEmptyTrial(reading.trial);
  const sealed = saved.assessment === null;
  const mine = useKeepMine();
  if (reading.panelsOwn)
    return mine.said === '' ? null : (
      <p className="reading-said" role="status">
        {mine.said}
      </p>
    );
  const sentences = readingSentences(reading.coexistence, saved.settings.coexistence, trial);
  return (
    <div className="reading-band" data-trial={trial || undefined} role="region" aria-label="What you read">
      <div>
        <p>
          {trial && <b>A trial. Only you see it. </b>}
          {sealed && 'It reads your own numbers alone; the others’ are sealed. '}
          {reading.state === 'shown' ? sentences.join(' ') : <ReadingState />}
        </p>
        {trial && <Tried />}
      </div>
      {trial ? (
        <div className="reading-actions">
          <TrialActions mine={mine} />
        </div>
      ) : (
        <Button variant="outline" className="no-print" onClick={reading.back}>
          Back to the panel’s reading
        </Button>
      )}
    </div>
  );
}

/** What is tried, the first of it. */
function Tried() {
  const { reading, saved, columns, open } = useLedger();
  const changes = trialChanges(reading.trial, saved, columns);
  const more = changes.length - mostSaid;
  return (
    <>
      <ul className="reading-changes">
        {changes.slice(0, mostSaid).map(({ key, sentence }) => (
          <li key={key}>{sentence}.</li>
        ))}
      </ul>
      <button
        type="button"
        className="text-button no-print"
        onClick={() => {
          open({ kind: 'trial', findingId: null });
        }}
      >
        {more > 0 ? `And ${counted(more, 'change')} more` : 'Change the trial'}
      </button>
    </>
  );
}

/** While it is not on the screen yet, or cannot be. */
function ReadingState() {
  const { reading } = useLedger();
  if (reading.state === 'refused')
    return <b role="alert">It cannot be computed so: the numbers below are the panel’s own.</b>;
  return (
    <span role="status">
      {reading.heavy
        ? 'Computing every combination of the candidates; until then the numbers below are as they were.'
        : 'Computing.'}
    </span>
  );
}
