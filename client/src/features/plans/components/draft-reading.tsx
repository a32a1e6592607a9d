import type { Plan } from '@weighhouse/shared/contracts/plans';
import { useFormat } from '../../../lib/use-format';
import { ActionList } from './action-list';
import { PlanPart, PlanText } from './plan-text';
import { StanceForm } from './stance-form';
import { StanceList } from './stance-list';

interface Props {
  caseId: string;
  plan: Plan;
  meId: string;
  /** This person is asked to agree or dissent. */
  mayAnswer: boolean;
}

/** The draft as everybody but its writer sees it. */
export function DraftReading({ caseId, plan, meId, mayAnswer }: Props) {
  const format = useFormat();
  const asked = plan.askedAt;
  return (
    <div className="plan-main">
      <p className="soft">
        {asked === null
          ? 'A draft: it can still change, and nobody has been asked about it.'
          : `A draft. The contributors were asked ${format.moment(asked)}.`}
      </p>
      <PlanText plan={plan} actions={<ActionList caseId={caseId} actions={plan.actions} />} />
      {mayAnswer && asked !== null && (
        <StanceForm caseId={caseId} plan={plan} mine={plan.stances.find((one) => one.person.id === meId)} />
      )}
      {asked !== null && (
        <PlanPart title="What the contributors say">
          <StanceList stances={plan.stances} />
        </PlanPart>
      )}
    </div>
  );
}
