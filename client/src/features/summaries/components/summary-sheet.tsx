import type { Summary } from '@weighhouse/shared/contracts/summaries';
import { useFormat } from '../../../lib/use-format';
import { SummaryText } from './summary-text';

/** The sheet for the patient, on paper alone: A4 in large print. It carries no name, so that a lost one tells nobody's. */
export function SummarySheet({ summary }: { summary: Summary }) {
  const format = useFormat();
  const { number, body, approvedBy, approvedAt } = summary;
  return (
    <section className="summary-sheet" aria-hidden="true">
      <h2>What the doctors found, in plain words</h2>
      {approvedAt === null && <p>Draft. Not approved, not for the patient yet.</p>}
      <SummaryText body={body} />
      <p className="sheet-foot">
        Number {number}.
        {approvedAt !== null &&
          ` Approved ${format.day(approvedAt)}${approvedBy === null ? '' : ` by ${approvedBy}`}.`}{' '}
        This text comes from a discussion between doctors. It does not replace the advice of your own doctor
        or emergency care. If you get worse, call the emergency services.
      </p>
    </section>
  );
}
