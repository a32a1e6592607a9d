import { Navigate } from 'react-router-dom';
import { useCase, useCaseId } from '../api/get-case';

/** A case opens where one's work is: contributors and the chair in the differential, others in the history. */
export default function FirstSection() {
  const { data } = useCase(useCaseId());
  if (!data) return null;
  const judges = data.parts.includes('contributor') || data.parts.includes('chair');
  const begun = !['draft', 'submitted', 'returned', 'declined'].includes(data.state);
  return <Navigate to={judges && begun ? 'differential' : 'history'} replace />;
}
