import type { ComponentType } from 'react';
import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { SkeletonPage } from '../components/skeleton';
import { NotFound } from './not-found';
import { RouteFailure } from './route-failure';
import { Shell } from './shell';

type Load = () => Promise<{ default: ComponentType }>;

/** A route whose code is loaded when somebody goes there. */
const lazy = (path: string, load: Load, children?: RouteObject[]): RouteObject => ({
  path,
  lazy: async () => ({ Component: (await load()).default }),
  ...(children ? { children } : {}),
});

const index = (load: Load): RouteObject => ({
  index: true,
  lazy: async () => ({ Component: (await load()).default }),
});

const sections: RouteObject[] = [
  index(() => import('../features/cases/routes/first-section')),
  lazy('history', () => import('../features/cases/routes/history')),
  lazy('reports', () => import('../features/reports/routes/reports')),
  lazy('differential', () => import('../features/differential/routes/differential')),
  lazy('next-test', () => import('../features/differential/routes/next-test')),
  lazy('plan', () => import('../features/plans/routes/plan'), [
    {
      index: true,
      lazy: async () => ({ Component: (await import('../features/outcomes/routes/outcome')).default }),
    },
  ]),
  lazy('summary', () => import('../features/summaries/routes/summary')),
  lazy('trail', () => import('../features/trail/routes/trail')),
  lazy('team', () => import('../features/cases/routes/team')),
  lazy('settings', () => import('../features/cases/routes/settings')),
];

export const router = createBrowserRouter([
  {
    ErrorBoundary: RouteFailure,
    HydrateFallback: SkeletonPage,
    children: [
      lazy('/sign-in', () => import('../features/people/routes/sign-in')),
      lazy('/invitation/:token', () => import('../features/people/routes/invitation')),
      {
        Component: Shell,
        children: [
          {
            ErrorBoundary: RouteFailure,
            children: [
              lazy('/', () => import('../features/today/routes/today')),
              lazy('/cases', () => import('../features/cases/routes/cases')),
              lazy('/cases/new', () => import('../features/cases/routes/new-referral')),
              lazy('/cases/:caseId/edit', () => import('./referral-page')),
              lazy('/cases/:caseId', () => import('../features/cases/routes/case-page'), sections),
              lazy('/tell', () => import('../features/summaries/routes/tell')),
              lazy('/tell/:caseId', () => import('../features/summaries/routes/tell-case')),
              lazy('/people', () => import('../features/people/routes/people')),
              lazy('/account', () => import('../features/people/routes/account')),
              { path: '*', Component: NotFound },
            ],
          },
        ],
      },
    ],
  },
]);
