import type { PersonRef } from '@weighhouse/shared/contracts/common';
import { useFormat } from '../../../lib/use-format';
import { isSent, type PlanDraft } from '../model/plan-draft';
import { PlanPart, PlanText } from './plan-text';

/** A draft to read, for comparing one's own with another. */
export function DraftText({ draft, people }: { draft: PlanDraft; people: readonly PersonRef[] }) {
  const format = useFormat();
  const nameOf = (id: string | null) => people.find((person) => person.id === id)?.name ?? 'nobody yet';
  return (
    <PlanText
      plan={draft}
      actions={
        <PlanPart title="Actions">
          <ol className="plan-plain-actions">
            {draft.actions.filter(isSent).map((action) => (
              <li key={action.key}>
                {action.what}{' '}
                <span className="soft">
                  {nameOf(action.ownerId)}, {action.due === null ? 'no date yet' : format.date(action.due)}
                  {action.concernsPatient ? ', the patient is told' : ''}
                </span>
              </li>
            ))}
          </ol>
        </PlanPart>
      }
    />
  );
}
