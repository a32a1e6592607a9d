import { EmptyState } from '../../../components/empty-state';
import { useLedger } from './ledger-context';

/** Before there is anything to weigh. */
export function EmptyLedger() {
  const { may } = useLedger();
  return (
    <div className="ledger-empty">
      <EmptyState title="Nothing stands on this differential yet">
        {may('candidate.add')
          ? 'Add the candidates that could explain the illness, and the findings that speak for or against them. A round can be opened with two candidates and three findings.'
          : may('finding.add')
            ? 'Add the findings that are known. The panel adds the candidates.'
            : 'The panel adds candidates and findings once a chair has accepted the case.'}
      </EmptyState>
    </div>
  );
}
