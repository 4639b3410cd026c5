import '@testing-library/jest-dom/vitest';
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { afterEach, expect, test, vi } from 'vitest';
import type { SessionView } from '#core/contract/people.ts';
import { sessionKey } from '#web/session/session-query.ts';
import { Component as TeamPage } from '#web/team/team-page.tsx';

const ids = ['6f9d7c52-9d3e-4c39-8a3b-0d0c6a1c5e11', '0b6f3a3c-52b9-4a3e-9d41-6f5d1f0a7c02'];
const joined = { joinedAt: '2026-11-12T09:00:00Z', removedAt: null };
const members = [
  { id: ids[0], name: 'Ingrid Sahlén', email: 'ingrid@demo.example', roles: ['administrator'], ...joined },
  { id: ids[1], name: 'Chiara Bellandi', email: 'chiara@demo.example', roles: ['thermal-reviewer'], ...joined },
];

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function open(allowed: SessionView['allowed']) {
  const fetched = vi.fn<typeof fetch>((address, init) => {
    const path = typeof address === 'string' ? address.replace('/api/v1', '') : '';
    if (init?.method === 'DELETE') return Promise.resolve(new Response(null, { status: 204 }));
    if (path === '/team') return Promise.resolve(Response.json({ id: ids[0], name: 'Drive Electronics' }));
    return Promise.resolve(Response.json({ items: path === '/members' ? members : [] }));
  });
  vi.stubGlobal('fetch', fetched);
  const client = new QueryClient({ defaultOptions: { queries: { retry: false, staleTime: Infinity } } });
  client.setQueryData(sessionKey, {
    member: { id: ids[0], name: 'Ingrid Sahlén', email: 'ingrid@demo.example', roles: ['administrator'] },
    team: { id: ids[0], name: 'Drive Electronics' },
    allowed,
    expiresAt: '2099-01-01T10:00:00Z',
  });
  render(
    <QueryClientProvider client={client}>
      <MemoryRouter>
        <TeamPage />
      </MemoryRouter>
    </QueryClientProvider>,
  );
  return fetched;
}

test('team page – a member without the right – sees the members and no way to change them', async () => {
  open([]);
  expect(await screen.findByRole('cell', { name: 'Chiara Bellandi' })).toBeInTheDocument();
  expect(screen.queryByRole('button')).not.toBeInTheDocument();
});

test('team page – an administrator removes a member – asked by name first, then the server is told', async () => {
  const user = userEvent.setup();
  const fetched = open(['manage-members']);
  await user.click(await screen.findByRole('button', { name: 'Remove Chiara Bellandi' }));
  expect(screen.getByRole('button', { name: 'Keep Chiara Bellandi' })).toHaveFocus();
  const removals = () => fetched.mock.calls.filter(([, init]) => init?.method === 'DELETE');
  expect(removals()).toHaveLength(0);
  await user.click(screen.getByRole('button', { name: 'Remove Chiara Bellandi' }));
  expect(removals().map(([address]) => address)).toEqual([`/api/v1/members/${ids[1]}`]);
});
