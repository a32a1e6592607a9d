import type { Summary } from '@weighhouse/shared/contracts/summaries';
import { Button } from '@radix-ui/themes';
import { useState } from 'react';
import { useReportAction } from '../../plans/api/report-action';
import { WordsForm } from '../../../components/words-form';
import { useFormat } from '../../../lib/use-format';

/** What of the signed plan concerns the patient: actions and the safety-net advice. */
export function PatientPart({ summary }: { summary: Summary }) {
  const { caseId, planNumber, actions, safetyNet } = summary;
  if (planNumber === null) return null;
  return (
    <section className="tell-part no-print" aria-labelledby="patient-part">
      <h2 id="patient-part">From plan {planNumber}, for the patient</h2>
      <h3>What happens next</h3>
      {actions.length === 0 ? (
        <p className="soft">No action of the plan concerns the patient or is yours.</p>
      ) : (
        <ul className="patient-actions">
          {actions.map((action) => (
            <ActionItem key={action.id ?? action.what} caseId={caseId} action={action} />
          ))}
        </ul>
      )}
      <h3>Safety-net advice</h3>
      {safetyNet === null || safetyNet === '' ? (
        <p className="soft">The plan gives none.</p>
      ) : (
        <p className="contact-words">{safetyNet}</p>
      )}
    </section>
  );
}

type Action = Summary['actions'][number];

/** An action that the patient is told of, or that the reader owns and reports done. */
function ActionItem({ caseId, action }: { caseId: string; action: Action }) {
  const format = useFormat();
  const { id, what, due, mine, doneAt } = action;
  const done = doneAt !== null && doneAt !== undefined;
  return (
    <li>
      {what}
      {due !== null && <span className="soft"> by {format.date(due)}.</span>}
      {mine === true && <span className="soft"> Yours.</span>}
      {done && <span className="soft"> Done {format.day(doneAt)}.</span>}
      {mine === true && !done && id !== undefined && <Report caseId={caseId} id={id} what={what} />}
    </li>
  );
}

function Report({ caseId, id, what }: { caseId: string; id: string; what: string }) {
  const report = useReportAction(caseId, id);
  const [open, setOpen] = useState(false);
  if (!open)
    return (
      <div className="actions">
        <Button
          variant="outline"
          size="1"
          onClick={() => {
            setOpen(true);
          }}
        >
          Report it done<span className="aside-text"> {what}</span>
        </Button>
      </div>
    );
  return (
    <WordsForm
      keptKey={`action.${id}`}
      label="What was done, and what came of it"
      verb="Report it done"
      onSend={report.mutateAsync}
      onClose={() => {
        setOpen(false);
      }}
    />
  );
}
