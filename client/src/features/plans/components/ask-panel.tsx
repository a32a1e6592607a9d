import { Button } from '@radix-ui/themes';
import type { PlanView } from '@weighhouse/shared/contracts/plans';
import { useState } from 'react';
import { FailureLine } from '../../../components/failure';
import { useFormat } from '../../../lib/use-format';
import { useAskContributors } from '../api/ask-contributors';
import { isOfText } from '../model/missing-words';
import { stanceCount, waitingWords } from '../model/plan-words';
import { PlanPart } from './plan-text';
import { StanceList } from './stance-list';

interface Props {
  caseId: string;
  view: PlanView;
  /** Saves what is typed; false when something is left unsaved. */
  save: () => Promise<boolean>;
}

/** Agreement and dissent, as the chair asks for and sees them. */
export function AskPanel({ caseId, view: { draft, abilities, missing }, save }: Props) {
  const format = useFormat();
  const ask = useAskContributors(caseId);
  const [unsaved, setUnsaved] = useState(false);
  const asked = draft?.askedAt ?? null;
  const whole = !missing.some(isOfText);
  const mayAsk = abilities.includes('plan.ask') && whole;
  const settled = draft?.stances.every((one) => one.stance !== null && one.changedSince !== true) ?? false;

  const send = async () => {
    const saved = await save();
    setUnsaved(!saved);
    if (saved) ask.mutate();
  };

  return (
    <PlanPart title="Agreement and dissent">
      <p className="soft prose">
        {asked === null
          ? 'Every contributor is asked to agree or to dissent. Dissent stands in the signed plan; it does not stop it.'
          : `Asked ${format.moment(asked)}. ${draft ? `${stanceCount(draft)} ${waitingWords(draft)}` : ''}`}
      </p>
      {draft && asked !== null && <StanceList stances={draft.stances} />}
      {!whole && (
        <p className="soft prose">They can be asked when the plan is complete: see below what is missing.</p>
      )}
      {mayAsk && !(asked !== null && settled) && (
        <div className="actions">
          <Button variant="outline" loading={ask.isPending} onClick={() => void send()}>
            {asked === null ? 'Ask contributors' : 'Ask again'}
          </Button>
          {asked !== null && (
            <span className="soft small">Asks those who have not answered the plan as it stands.</span>
          )}
        </div>
      )}
      {unsaved && (
        <p className="failure-line" role="alert">
          Something of the plan is not saved yet, so nobody was asked. See above.
        </p>
      )}
      <FailureLine error={ask.error} />
    </PlanPart>
  );
}
