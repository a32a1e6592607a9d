import { Button } from '@radix-ui/themes';
import type { PlanView } from '@weighhouse/shared/contracts/plans';
import { useState } from 'react';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { fieldId } from '../../../components/faults';
import { useConclude } from '../api/conclude';
import { isOfText, missingWords } from '../model/missing-words';
import { PlanPart } from './plan-text';

interface Props {
  caseId: string;
  view: PlanView;
  number: number;
  save: () => Promise<boolean>;
}

/** What is still missing, and the signing itself. */
export function ConcludePanel({ caseId, view: { missing, abilities }, number, save }: Props) {
  const conclude = useConclude(caseId);
  const [open, setOpen] = useState(false);
  const [unsaved, setUnsaved] = useState(false);
  const may = abilities.includes('plan.conclude');

  const ask = async () => {
    const saved = await save();
    setUnsaved(!saved);
    setOpen(saved);
  };

  return (
    <PlanPart title="Close the case">
      {missing.length > 0 && <Missing missing={missing} />}
      {missing.length === 0 && !may && (
        <p className="soft">The case cannot be closed while a round is sealed.</p>
      )}
      {missing.length === 0 && may && (
        <>
          <p className="soft prose">Nothing is missing. Signing needs your password.</p>
          <div className="actions">
            <Button onClick={() => void ask()}>Close with this plan</Button>
          </div>
        </>
      )}
      {unsaved && (
        <p className="failure-line" role="alert">
          Something of the plan is not saved yet. See above.
        </p>
      )}
      <ConfirmDialog
        open={open}
        onOpenChange={setOpen}
        title={`Close the case with plan ${String(number)}?`}
        verb="Close with this plan"
        password
        onConfirm={({ password }) => conclude.mutateAsync(password)}
      >
        You sign the plan with your name, together with where the panel stands now and the dissent on the
        record. Nobody can edit it afterwards, you included: if something changes, reopen the case and sign a
        later plan. The liaison then tells the patient.
      </ConfirmDialog>
    </PlanPart>
  );
}

/** Each missing part by name, leading to its field where there is one. */
function Missing({ missing }: Pick<PlanView, 'missing'>) {
  return (
    <>
      <p>Before the case can be closed, this is still missing:</p>
      <ul className="plain-list">
        {missing.map((part) => (
          <li key={`${part.path} ${part.message}`}>
            {isOfText(part) && part.path !== 'plan' ? (
              <a
                href={`#${fieldId(part.path)}`}
                onClick={(event) => {
                  event.preventDefault();
                  document.getElementById(fieldId(part.path))?.focus();
                }}
              >
                {missingWords(part)}
              </a>
            ) : (
              missingWords(part)
            )}
          </li>
        ))}
      </ul>
    </>
  );
}
