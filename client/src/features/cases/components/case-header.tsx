import type { Case } from '@weighhouse/shared/contracts/cases';
import { usePresent } from '../../../lib/live';
import { useFormat } from '../../../lib/use-format';
import { counted } from '../../../lib/words';
import { CaseActions } from './case-actions';
import { patientWords, stateLine, urgencyWords } from './case-words';

/** The question, whose it is, how urgent, and what is so on the case now. */
export function CaseHeader({ of }: { of: Case }) {
  const format = useFormat();
  const present = usePresent(of.id);
  const conference =
    of.conferenceAt === null ? 'No conference date yet' : `Conference ${format.moment(of.conferenceAt)}`;
  return (
    <header className="case-header">
      <div>
        <h1>{of.question === '' ? 'A question not written yet' : of.question}</h1>
        <p className="case-meta">
          <span className="figures">{of.number}</span>
          <span>{patientWords(of)}</span>
          <span>
            Referred by {of.referrer.name}, {of.referrer.centre}
          </span>
          <span>{conference}</span>
          {of.urgency !== null && <span>Urgency: {urgencyWords[of.urgency]}</span>}
          {present !== null && present > 1 && (
            <span>{counted(present, 'person', 'people')} on this case now</span>
          )}
        </p>
      </div>
      <div className="case-state no-print">
        <span>{stateLine(of)}</span>
        <CaseActions of={of} />
      </div>
    </header>
  );
}
