import '../components/team.css';
import type { Case } from '@weighhouse/shared/contracts/cases';
import { EmptyState } from '../../../components/empty-state';
import { useCase, useCaseId } from '../api/get-case';
import { AcceptForm } from '../components/accept-form';
import { TeamForm } from '../components/team-form-section';
import { TeamList } from '../components/team-list';

/** The team of a case: set when it is accepted, changed by its chair later, read by the others. */
export default function TeamPage() {
  const { data } = useCase(useCaseId());
  if (!data) return null;
  return <div className="page team-page">{content(data)}</div>;
}

function content(of: Case) {
  if (of.abilities.includes('case.accept')) return <AcceptForm of={of} />;
  if (of.abilities.includes('team.set')) return <TeamForm of={of} />;
  if (of.team.length > 0) return <TeamList of={of} />;
  return <EmptyState title="Nobody is on the team yet." />;
}
