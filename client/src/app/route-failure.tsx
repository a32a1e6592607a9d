import { useEffect, useState } from 'react';
import { useRouteError } from 'react-router-dom';
import { Failure } from '../components/failure';
import { SkeletonPage } from '../components/skeleton';
import { offlineError } from '../lib/api-error';
import { lacksCode, loadAnew } from './newer-version';

/** In place of a page whose code failed or could not be loaded. */
export function RouteFailure() {
  const error = useRouteError();
  const [loading, setLoading] = useState(() => lacksCode(error));
  const [unreachable, setUnreachable] = useState(false);
  useEffect(() => {
    if (!loading) return;
    void loadAnew().then((begun) => {
      if (begun) return;
      setUnreachable(true);
      setLoading(false);
    });
  }, [loading]);
  if (loading) return <SkeletonPage />;
  return (
    <main className="page">
      <Failure
        error={unreachable ? offlineError() : error}
        what="This page could not be shown."
        retry={() => {
          location.reload();
        }}
      />
    </main>
  );
}
