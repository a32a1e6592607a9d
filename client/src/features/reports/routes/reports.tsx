import { useCase, useCaseId } from '../../cases/api/get-case';
import { Reports } from '../components/reports';

/** The section of a case with its reports. */
export default function ReportsPage() {
  const caseId = useCaseId();
  const { data } = useCase(caseId);
  return (
    <section className="page reports-page" aria-label="Reports">
      <Reports caseId={caseId} mayAdd={data?.abilities.includes('report.add') ?? false} />
    </section>
  );
}
