import { EmptyState } from '../../../components/empty-state';

export default function NotBuilt() {
  return <EmptyState title="This section is not part of this version." />;
}
