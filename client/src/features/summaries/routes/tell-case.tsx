import '../components/summaries.css';
import type { Summary } from '@weighhouse/shared/contracts/summaries';
import { Link } from 'react-router-dom';
import { EmptyState } from '../../../components/empty-state';
import { Failure } from '../../../components/failure';
import { PageTitle } from '../../../components/page-title';
import { SkeletonPage } from '../../../components/skeleton';
import { isApiError } from '../../../lib/api';
import { useWatchCase } from '../../../lib/live';
import { useCaseId } from '../../cases/api/get-case';
import { useSignedIn } from '../../people/api/get-me';
import { useSummary } from '../api/get-summary';
import { Contacts } from '../components/contacts';
import { IdentityForm } from '../components/identity-form';
import { PatientPart } from '../components/patient-part';
import { SummaryPart } from '../components/summary-part';
import { SummarySheet } from '../components/summary-sheet';
import { summaryTitle } from '../model/summary-words';

/** Everything the liaison needs of a case, and nothing else of it. */
export default function TellCase() {
  const caseId = useCaseId();
  useWatchCase(caseId);
  const { data, error, isPending, refetch } = useSummary(caseId);
  if (isPending) return <SkeletonPage />;
  if (data) return <Loaded key={caseId} summary={data} />;
  const early = isApiError(error) && error.status === 409;
  return (
    <div className="page">
      <Back />
      {early ? (
        <>
          <PageTitle>Nothing to tell yet</PageTitle>
          <EmptyState title="The panel is still judging">
            You write the summary when the chair has closed the case with a plan.
          </EmptyState>
          <Card caseId={caseId} />
        </>
      ) : (
        <Failure error={error} what="This could not be opened." retry={() => void refetch()} />
      )}
    </div>
  );
}

function Loaded({ summary }: { summary: Summary }) {
  const { caseId, number, planNumber } = summary;
  // A chair who came here by an address gets no card to open.
  const liaison = useSignedIn().roles.includes('liaison');
  return (
    <div className="page tell-page">
      <Back />
      <PageTitle note={<span className="figures">{number}</span>}>{summaryTitle(summary)}</PageTitle>
      <div className="tell-columns">
        <div>
          {planNumber === null ? (
            <EmptyState title="The panel is still judging">
              You write the summary when the chair has closed the case with a plan.
            </EmptyState>
          ) : (
            <>
              <SummaryPart key={planNumber} summary={summary} />
              <Contacts summary={summary} />
            </>
          )}
        </div>
        <div className="tell-side">
          {liaison && <Card caseId={caseId} />}
          <PatientPart summary={summary} />
        </div>
      </div>
      <SummarySheet summary={summary} />
    </div>
  );
}

function Card({ caseId }: { caseId: string }) {
  return (
    <section className="tell-part no-print" aria-labelledby="identity-part">
      <h2 id="identity-part">The patient</h2>
      <IdentityForm caseId={caseId} />
    </section>
  );
}

const Back = () => (
  <p className="small no-print tell-back">
    <Link to="/tell">All that waits to be told</Link>
  </p>
);
