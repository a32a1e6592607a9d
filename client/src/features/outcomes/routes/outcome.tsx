import { useCase, useCaseId } from '../../cases/api/get-case';
import { OutcomePanel } from '../components/outcome-panel';

/** The outcome, below the plan. */
export default function OutcomeSection() {
  const caseId = useCaseId();
  const { data } = useCase(caseId);
  return <OutcomePanel caseId={caseId} mayRecord={data?.abilities.includes('outcome.record') ?? false} />;
}
