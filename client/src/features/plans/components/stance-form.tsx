import { Button, TextArea } from '@radix-ui/themes';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { dissentSchema, type Plan } from '@weighhouse/shared/contracts/plans';
import { z } from 'zod';
import { type SubmitEvent, useState } from 'react';
import { FailureLine } from '../../../components/failure';
import { faultsIn } from '../../../components/faults';
import { FormField } from '../../../components/form-field';
import { useFormat } from '../../../lib/use-format';
import { useGiveStance } from '../api/give-stance';
import { useKept } from '../../../lib/use-kept';

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
        <DissentForm
          caseId={caseId}
          planId={plan.id}
          give={give}
          before={mine?.words ?? ''}
          onClose={close}
        />
      ) : (
        <>
          <FailureLine error={give.error} />
          <div className="actions">
            {mine?.stance !== 'agree' && (
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
      {mine.words !== null && mine.words !== '' && <p className="note plan-words">{mine.words}</p>}
    </>
  );
}

interface DissentProps {
  caseId: string;
  planId: string;
  before: string;
  give: ReturnType<typeof useGiveStance>;
  onClose: () => void;
}

function DissentForm({ planId, before, give, onClose }: DissentProps) {
  const [words, setWords, clear] = useKept(`dissent.${planId}`, z.string(), '');
  const [faults, setFaults] = useState<FieldFault[]>([]);
  const [touched, setTouched] = useState(false);
  const text = touched || words !== '' ? words : before;

  const send = (event: SubmitEvent) => {
    event.preventDefault();
    const found = faultsIn(dissentSchema, { words: text });
    setFaults(found);
    if (found.length > 0) return;
    give.mutate(text.trim(), {
      onSuccess: () => {
        clear();
        onClose();
      },
    });
  };

  return (
    <form onSubmit={send}>
      <FormField
        label="What you want on the record against this plan"
        path="words"
        faults={faults}
        hint="The chair and the team read it, and it stands in the signed plan."
      >
        {(control) => (
          <TextArea
            {...control}
            autoFocus
            rows={5}
            maxLength={4000}
            value={text}
            onChange={(event) => {
              setTouched(true);
              setWords(event.target.value);
            }}
          />
        )}
      </FormField>
      <FailureLine error={give.error} />
      <div className="actions">
        <Button type="submit" loading={give.isPending}>
          Put dissent on the record
        </Button>
        <Button type="button" variant="outline" onClick={onClose}>
          Not now
        </Button>
      </div>
    </form>
  );
}
