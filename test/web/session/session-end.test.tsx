import '@testing-library/jest-dom/vitest';
import { QueryClientProvider, useQuery } from '@tanstack/react-query';
import { cleanup, render, screen } from '@testing-library/react';
import { createMemoryRouter, RouterProvider, useLocation } from 'react-router-dom';
import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import type { SessionView } from '#core/contract/people.ts';
import { SignedIn } from '#web/layout/signed-in.tsx';
import { safeReturn } from '#web/paths.ts';
import { queryClient } from '#web/server/query-client.ts';
import { requireSession } from '#web/session/require-session.ts';
import { sessionKey } from '#web/session/session-query.ts';
import { teamQuery } from '#web/team/team-queries.ts';

const session: SessionView = {
  member: {
    id: '6f9d7c52-9d3e-4c39-8a3b-0d0c6a1c5e11',
    name: 'Ingrid',
    email: 'ingrid@demo.example',
    roles: ['administrator'],
  },
  team: { id: '0b6f3a3c-52b9-4a3e-9d41-6f5d1f0a7c02', name: 'Drive Electronics' },
  allowed: [],
  expiresAt: '2099-01-01T10:00:00Z',
};

beforeEach(() => {
  vi.stubGlobal('matchMedia', () => ({ matches: false, addEventListener: () => undefined }));
});
afterEach(() => {
  cleanup();
  queryClient.clear();
  vi.unstubAllGlobals();
});

function TeamName() {
  return <p>{useQuery(teamQuery).data?.name ?? 'waiting'}</p>;
}

function WhereAmI() {
  const { pathname, search } = useLocation();
  return <p>{pathname + search}</p>;
}

function open(path: string) {
  const router = createMemoryRouter(
    [
      {
        element: <SignedIn />,
        loader: requireSession,
        hydrateFallbackElement: <p>loading</p>,
        children: [{ path: '/team', element: <TeamName /> }],
      },
      { path: '/sign-in', element: <WhereAmI /> },
    ],
    { initialEntries: [path] },
  );
  render(
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
}

const returns = '/sign-in?to=%2Fteam%3Ftab%3Dmembers';

test('page behind the sign-in – nobody signed in – the sign-in page, with the way back', async () => {
  vi.stubGlobal('fetch', () => Promise.resolve(Response.json(null)));
  open('/team?tab=members');
  expect(await screen.findByText(returns)).toBeInTheDocument();
});

test('open page – the server answers 401 – the session has ended: the sign-in page, with the way back', async () => {
  queryClient.setQueryData(sessionKey, session);
  const problem = { type: 'about:blank', title: 'Signed out', status: 401, code: 'signed-out', detail: 'Sign in.' };
  vi.stubGlobal('fetch', () => Promise.resolve(Response.json(problem, { status: 401 })));
  open('/team?tab=members');
  expect(await screen.findByText(returns)).toBeInTheDocument();
});

test('way back – an address outside the application – never followed', () => {
  for (const to of ['https://example.org/', '//example.org', '/\\example.org', 'javascript:alert(1)', null]) {
    expect(safeReturn(to)).toBe('/assemblies');
  }
  expect(safeReturn('/revisions/1/sketch?select=U1')).toBe('/revisions/1/sketch?select=U1');
});
