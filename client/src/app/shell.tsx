import './shell.css';
import { useState, useSyncExternalStore } from 'react';
import { Navigate, NavLink, Outlet, ScrollRestoration, useLocation } from 'react-router-dom';
import { Failure } from '../components/failure';
import { SkeletonPage } from '../components/skeleton';
import { useMe } from '../features/people/api/get-me';
import { SignInForm } from '../features/people/components/sign-in-form';
import { useLiveState } from '../lib/live';
import { TimeZoneContext } from '../lib/use-format';
import { AccountMenu } from './account-menu';
import { BrandMark } from '../components/brand-mark';
import { placesOf } from './navigation';
import { useSessionOver } from './session-over';

/** The frame around every page of a signed-in person. */
export function Shell() {
  const me = useMe();
  const over = useSessionOver(me.data != null);
  const { pathname, search } = useLocation();
  const [seen, setSeen] = useState(false);
  if (me.data && !seen) setSeen(true);
  if (me.isPending) return <SkeletonPage />;
  if (me.data === undefined)
    return (
      <div className="page">
        <Failure error={me.error} what="The page could not be opened." retry={() => void me.refetch()} />
      </div>
    );
  if (me.data === null) {
    // Whoever signed out does not want the next person to land on their page.
    const to =
      seen || (pathname === '/' && search === '') ? '' : `?to=${encodeURIComponent(pathname + search)}`;
    return <Navigate to={`/sign-in${to}`} replace />;
  }
  return (
    <TimeZoneContext value={me.data.timeZone}>
      <div hidden={over}>
        <a className="skip-link" href="#content">
          Skip to the content
        </a>
        <header className="bar no-print">
          <NavLink to="/" className="brand" aria-label="Weighhouse, to today">
            <BrandMark />
            <span>Weighhouse</span>
          </NavLink>
          <nav aria-label="Main">
            {placesOf(me.data.roles).map((place) => (
              <NavLink key={place.to} to={place.to} end={place.to === '/'}>
                {place.label}
              </NavLink>
            ))}
          </nav>
          <div className="bar-end">
            <Connection />
            <AccountMenu me={me.data} />
          </div>
        </header>
        <main id="content" tabIndex={-1}>
          <Outlet />
        </main>
      </div>
      {over && (
        <main className="narrow-page">
          <h1>Your session is over</h1>
          <p className="soft">Sign in again to go on where you were. Nothing you typed is lost.</p>
          <SignInForm email={me.data.email} />
        </main>
      )}
      <ScrollRestoration />
    </TimeZoneContext>
  );
}

const subscribeOnline = (listener: () => void) => {
  window.addEventListener('online', listener);
  window.addEventListener('offline', listener);
  return () => {
    window.removeEventListener('online', listener);
    window.removeEventListener('offline', listener);
  };
};

/** Says so when changes by others do not arrive. */
function Connection() {
  const live = useLiveState();
  const online = useSyncExternalStore(subscribeOnline, () => navigator.onLine);
  const words = !online ? 'Offline' : live === 'reconnecting' ? 'Reconnecting' : '';
  return (
    <span role="status" className={words === '' ? 'aside-text' : 'connection'}>
      {words}
    </span>
  );
}
