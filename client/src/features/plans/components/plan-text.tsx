import type { Certainty } from '@weighhouse/shared/contracts/plans';
import type { ReactNode } from 'react';
import { certaintyWords } from '../model/certainty-words';

interface Text {
  workingDiagnosis: string;
  certainty: Certainty | null;
  remainingDoubt: string;
  safetyNet: string;
}

/** The plan's words to read; `actions` stand between the doubt and the advice, where the reader looks for them. */
export function PlanText({ plan, actions }: { plan: Text; actions: ReactNode }) {
  const certainty = plan.certainty && certaintyWords[plan.certainty];
  return (
    <div className="plan-text">
      <PlanPart title="Working diagnosis">
        <p className="plan-diagnosis">{plan.workingDiagnosis || <Missing />}</p>
        <p>
          {certainty ? (
            <>
              <b>{certainty.name}.</b> <span className="soft">{certainty.meaning}</span>
            </>
          ) : (
            <span className="soft">How certain it is has not been said yet.</span>
          )}
        </p>
      </PlanPart>
      <PlanPart title="Remaining doubt">
        <Words>{plan.remainingDoubt}</Words>
      </PlanPart>
      {actions}
      <PlanPart title="Safety-net advice">
        <Words>{plan.safetyNet}</Words>
      </PlanPart>
    </div>
  );
}

const Missing = () => <span className="soft">Not written yet</span>;

/** Text as it was typed, line by line. */
export function Words({ children }: { children: string }) {
  return <p className="plan-words">{children.trim() === '' ? <Missing /> : children}</p>;
}

/** A ruled part of a plan with its name. */
export function PlanPart({
  title,
  note,
  children,
}: {
  title: string;
  note?: ReactNode;
  children: ReactNode;
}) {
  return (
    <section className="plan-part">
      <h3>{title}</h3>
      {note}
      {children}
    </section>
  );
}
