import { useLedger } from '../ledger/ledger-context';
import { assumptionOf } from './reading-words';
import { assumptions } from './wish';

/** How the numbers are read: a switch between the two assumptions, for oneself. */
export function AssumptionSwitch() {
  const { reading, open } = useLedger();
  const current = assumptionOf(reading.coexistence);
  return (
    <span className="assumption" role="group" aria-label="Assumption">
      <button
        type="button"
        className="assumption-word"
        aria-label="Assumption: what it means"
        onClick={() => {
          open({ kind: 'assumption' });
        }}
      >
        Assumption:
      </button>{' '}
      {assumptions.map((assumption, index) => (
        <span key={assumption}>
          {index > 0 && ' / '}
          <button
            type="button"
            className="assumption-choice"
            aria-pressed={assumption === current}
            onClick={() => {
              reading.assume(assumption);
            }}
          >
            {assumption}
          </button>
        </span>
      ))}
    </span>
  );
}
