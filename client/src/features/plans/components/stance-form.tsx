import { Button } from '@radix-ui/themes';
import type { Plan } from '@weighhouse/shared/contracts/plans';
import { useState } from 'react';
import { FailureLine } from '../../../components/failure';
import { WordsForm } from '../../../components/words-form';
import { useFormat } from '../../../lib/use-format';
import { useGiveStance } from '../api/give-stance';

interface Props {
  caseId: string;
  plan: Plan;
  /** What this contributor has said so far. */
  mine: Plan['stances'][number] | undefined;
}

/** A contributor agrees, or puts dissent on the record; either can be changed until the plan is signed. */
export function StanceForm({ caseId, plan, mine }: Props) {
  const give = useGiveStance(caseId);
  const [dissenting, setDissenting] = useState(false);
  const close = () => {
    setDissenting(false);
  };
  return (
    <section className="plan-stance" aria-label="Your word on this plan">
      <h3>{mine?.stance ? 'Your word on this plan' : 'You are asked: do you agree with this plan?'}</h3>
      <Said mine={mine} />
      {dissenting ? (
        <WordsForm
          keptKey={`dissent.${plan.id}`}
          before={mine?.words ?? ''}
          label="What you want on the record against this plan"
          hint="The chair and the team read it, and it stands in the signed plan."
          verb="Put dissent on the record"
          onSend={give.mutateAsync}
          onClose={close}
        />
      ) : (
        <>
          <FailureLine error={give.error} />
          <div className="actions">
            {(mine?.stance !== 'agree' || mine.changedSince === true) && (
              <Button
                loading={give.isPending}
                onClick={() => {
                  give.mutate(null);
                }}
              >
                Agree with this plan
              </Button>
            )}
            <Button
              variant="outline"
              onClick={() => {
                give.reset();
                setDissenting(true);
              }}
            >
              {mine?.stance === 'dissent' ? 'Change your dissent' : 'Write dissent'}
            </Button>
          </div>
        </>
      )}
    </section>
  );
}

function Said({ mine }: Pick<Props, 'mine'>) {
  const format = useFormat();
  if (!mine?.stance || mine.at === null)
    return (
      <p className="soft prose">
        Dissent stands in the signed plan under your name, in your words. It does not stop the plan.
      </p>
    );
  return (
    <>
      <p role="status">
        You {mine.stance === 'agree' ? 'agreed' : 'dissented'}, {format.moment(mine.at)}.{' '}
        <span className="soft">You can change it until the plan is signed.</span>
      </p>
      {mine.changedSince === true && <p className="late">The plan was changed after you said this.</p>}
      {mine.words !== null && mine.words !== '' && <p className="note plan-words">{mine.words}</p>}
    </>
  );
}
