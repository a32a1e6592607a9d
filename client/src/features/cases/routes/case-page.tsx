import './case-page.css';
import type { Case } from '@weighhouse/shared/contracts/cases';
import { Outlet } from 'react-router-dom';
import { Failure } from '../../../components/failure';
import { useDocumentTitle } from '../../../components/page-title';
import { SkeletonPage } from '../../../components/skeleton';
import { useWatchCase } from '../../../lib/live';
import { useCase, useCaseId } from '../api/get-case';
import { CaseBanner } from '../components/case-banner';
import { CaseHeader } from '../components/case-header';
import { CaseTabs } from '../components/case-tabs';

/** The frame of a case: its header and sections around the section that is open. */
export default function CasePage() {
  const caseId = useCaseId();
  const found = useCase(caseId);
  if (found.data) return <Frame key={caseId} of={found.data} />;
  if (found.isPending) return <SkeletonPage />;
  return (
    <div className="page">
      <Failure error={found.error} what="This case could not be opened." retry={() => void found.refetch()} />
    </div>
  );
}

function Frame({ of }: { of: Case }) {
  useWatchCase(of.id);
  useDocumentTitle(`${of.number} ${of.question}`);
  return (
    <>
      <CaseHeader of={of} />
      <CaseBanner of={of} />
      <CaseTabs of={of} />
      <Outlet />
    </>
  );
}
