import type { Plan } from '@weighhouse/shared/contracts/plans';
import { Caution } from '../../../components/caution';
import { useFormat } from '../../../lib/use-format';
import { capital } from '../../../lib/words';
import { stanceCount } from '../model/plan-words';
import { ActionList } from './action-list';
import { PlanPart, PlanText } from './plan-text';
import { StanceList } from './stance-list';
import { StandingList } from './standing-list';

interface Props {
  caseId: string;
  plan: Plan;
  meId: string;
  /** The plan that is in force: its actions can be reported. */
  newest: boolean;
}

/** A signed plan, which nobody edits. */
export function SignedPlan({ caseId, plan, meId, newest }: Props) {
  return (
    <article className="signed-plan" aria-label={`Plan ${String(plan.number)}`}>
      {newest ? (
        <Body caseId={caseId} plan={plan} meId={meId} />
      ) : (
        <details>
          <summary>
            <SignedBy plan={plan} />
          </summary>
          <Body caseId={caseId} plan={plan} meId={meId} headed={false} />
        </details>
      )}
    </article>
  );
}

function SignedBy({ plan }: { plan: Plan }) {
  const format = useFormat();
  return (
    <>
      <b>Plan {plan.number}</b>
      <span className="soft">
        {' '}
        signed{plan.signedBy && ` by ${plan.signedBy.name}`}
        {plan.signedAt !== null && `, ${format.moment(plan.signedAt)}`}
      </span>
    </>
  );
}

function Body({ caseId, plan, meId, headed = true }: Omit<Props, 'newest'> & { headed?: boolean }) {
  const last = (plan.standing?.length ?? 0) - 1;
  return (
    <>
      {headed && (
        <h2 className="signed-head">
          <SignedBy plan={plan} />
        </h2>
      )}
      <PlanText
        plan={plan}
        actions={<ActionList caseId={caseId} actions={plan.actions} signed meId={meId} />}
      />
      <PlanPart title="Agreement and dissent">
        <p className="soft">{stanceCount(plan)}</p>
        <StanceList stances={plan.stances} />
      </PlanPart>
      {plan.standing && (
        <PlanPart title="Where the panel stood when it was signed">
          <StandingList
            label={`Where the panel stood at plan ${String(plan.number)}`}
            standing={plan.standing.map((one, place) => ({
              share: one.share,
              name: capital(one.name),
              none: place === last,
            }))}
          />
          {plan.method !== null && (
            <p className="soft small">
              Method: {plan.method}. Of 100 patients like this, so many would have each.
            </p>
          )}
        </PlanPart>
      )}
      <Caution />
    </>
  );
}
