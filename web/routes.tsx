import { Navigate, type RouteObject } from 'react-router-dom';
import { ErrorPage } from './errors/error-page.tsx';
import { Root } from './layout/root.tsx';
import { SignedIn } from './layout/signed-in.tsx';
import { paths } from './paths.ts';
import { requireSession } from './session/require-session.ts';
import { Loading } from './ui/loading.tsx';

const revisionPages: RouteObject[] = [
  { path: 'sketch', handle: { fill: true }, lazy: () => import('./editor/sketch-page.tsx') },
  { path: 'conditions', lazy: () => import('./conditions/conditions-page.tsx') },
  { path: 'rails', lazy: () => import('./rails/rails-page.tsx') },
  { path: 'results', lazy: () => import('./results/results-page.tsx') },
  { path: 'review', lazy: () => import('./review/review-page.tsx') },
  { path: 'record', lazy: () => import('./record/record-page.tsx') },
];

/** Every page of the product; each is loaded when it is first opened. `fill`: the page takes the height of the window. */
export const routes: RouteObject[] = [
  {
    element: <Root />,
    errorElement: <ErrorPage />,
    hydrateFallbackElement: (
      <div className="px-8">
        <Loading what="Dropwatt" />
      </div>
    ),
    children: [
      { path: '/', element: <Navigate to={paths.assemblies()} replace /> },
      { path: '/sign-in', lazy: () => import('./session/sign-in-page.tsx') },
      { path: '/password-reset', lazy: () => import('./session/reset-request-page.tsx') },
      { path: '/password-reset/:token', lazy: () => import('./session/reset-page.tsx') },
      { path: '/invitations/:token', lazy: () => import('./session/invitation-page.tsx') },
      {
        element: <SignedIn />,
        loader: requireSession,
        shouldRevalidate: () => false,
        children: [
          { path: '/assemblies', lazy: () => import('./assemblies/assemblies-page.tsx') },
          { path: '/assemblies/:assemblyId', lazy: () => import('./assemblies/assembly-page.tsx') },
          {
            path: '/revisions/:revisionId',
            lazy: () => import('./revision/revision-frame.tsx'),
            children: [{ index: true, element: <Navigate to="sketch" replace /> }, ...revisionPages],
          },
          { path: '/library', lazy: () => import('./library/library-page.tsx') },
          { path: '/method', lazy: () => import('./method/method-page.tsx') },
          { path: '/team', lazy: () => import('./team/team-page.tsx') },
          { path: '/audit', lazy: () => import('./audit/audit-page.tsx') },
          { path: '/mail', lazy: () => import('./mail/mail-page.tsx') },
          { path: '/account', lazy: () => import('./account/account-page.tsx') },
          { path: '*', lazy: () => import('./errors/not-found-page.tsx') },
        ],
      },
    ],
  },
];
