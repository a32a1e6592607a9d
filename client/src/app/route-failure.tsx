import { useRouteError } from 'react-router-dom';
import { Failure } from '../components/failure';

/** In place of a page whose code failed or could not be loaded. */
export function RouteFailure() {
  return (
    <main className="page">
      <Failure
        error={useRouteError()}
        what="This page could not be shown."
        retry={() => {
          location.reload();
        }}
      />
    </main>
  );
}
