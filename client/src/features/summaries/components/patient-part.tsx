import type { Summary } from '@weighhouse/shared/contracts/summaries';
import { useFormat } from '../../../lib/use-format';

/** What of the signed plan concerns the patient: actions and the safety-net advice. */
export function PatientPart({ summary }: { summary: Summary }) {
  const format = useFormat();
  const { planNumber, actions, safetyNet } = summary;
  if (planNumber === null) return null;
  return (
    <section className="tell-part no-print" aria-labelledby="patient-part">
      <h2 id="patient-part">From plan {planNumber}, for the patient</h2>
      <h3>What happens next</h3>
      {actions.length === 0 ? (
        <p className="soft">No action of the plan concerns the patient.</p>
      ) : (
        <ul className="patient-actions">
          {actions.map(({ what, due }) => (
            <li key={`${what} ${due ?? ''}`}>
              {what}
              {due !== null && <span className="soft"> by {format.date(due)}</span>}
            </li>
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
