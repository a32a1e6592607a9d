import '../components/summaries.css';
import type { Case } from '@weighhouse/shared/contracts/cases';
import type { Summary } from '@weighhouse/shared/contracts/summaries';
import { Link } from 'react-router-dom';
import { Caution } from '../../../components/caution';
import { EmptyState } from '../../../components/empty-state';
import { Failure } from '../../../components/failure';
import { SkeletonText } from '../../../components/skeleton';
import { isApiError } from '../../../lib/api';
import { useCase, useCaseId } from '../../cases/api/get-case';
import { useSummary } from '../api/get-summary';
import { ContactLog } from '../components/contact-log';
import { ReviewPanel } from '../components/review-panel';
import { StateLine } from '../components/summary-part';
import { SummaryText } from '../components/summary-text';
import { summaryTitle } from '../model/summary-words';

/** The summary as the team sees it. */
export default function SummarySection() {
  const caseId = useCaseId();
  const summary = useSummary(caseId);
  const ofCase = useCase(caseId);
  return (
    <div className="summary-section">
      {summary.data && ofCase.data ? (
        <Loaded summary={summary.data} ofCase={ofCase.data} />
      ) : isApiError(summary.error) && summary.error.status === 409 ? (
        <EmptyState title="There is no summary yet">
          The liaison writes it when the chair has closed the case with a plan.
        </EmptyState>
      ) : summary.error ? (
        <Failure
          error={summary.error}
          what="The summary could not be loaded."
          retry={() => void summary.refetch()}
        />
      ) : (
        <SkeletonText lines={8} />
      )}
    </div>
  );
}

function Loaded({ summary, ofCase }: { summary: Summary; ofCase: Case }) {
  const { parts } = ofCase;
  const { state, body, returnedWords, contacts, abilities } = summary;
  const seesContacts = parts.some((part) => part !== 'contributor');
  const told = parts.includes('liaison');
  return (
    <>
      <h2 className="summary-title">{summaryTitle(summary)}</h2>
      <StateLine summary={summary} />
      {told && (
        <p className="no-print">
          <Link to={`/tell/${ofCase.id}`}>Write and tell it</Link>
        </p>
      )}
      {returnedWords !== null && (state === 'draft' || state === 'none') && (
        <div className="note">
          <p className="small soft">The chair asks for changes:</p>
          <p className="contact-words">{returnedWords}</p>
        </div>
      )}
      {body.trim() === '' ? (
        <EmptyState title="Nothing is written yet">
          The liaison drafts it from the signed plan and hands it to the chair.
        </EmptyState>
      ) : (
        <SummaryText body={body} />
      )}
      {state === 'waiting' && abilities.includes('summary.approve') && <ReviewPanel summary={summary} />}
      <Caution />
      {seesContacts && (
        <section className="tell-part" aria-labelledby="contact-log">
          <h2 id="contact-log">Contacts with the patient</h2>
          <ContactLog contacts={contacts} />
        </section>
      )}
    </>
  );
}
