import { Link } from 'react-router-dom';
import { EmptyState } from '../components/empty-state';
import { PageTitle } from '../components/page-title';

export function NotFound() {
  return (
    <div className="page">
      <PageTitle>There is no such page</PageTitle>
      <EmptyState title="Check the address.">
        <Link to="/">Go to what waits for you</Link>
      </EmptyState>
    </div>
  );
}
