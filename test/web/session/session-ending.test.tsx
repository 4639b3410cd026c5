import '@testing-library/jest-dom/vitest';
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { act, cleanup, render, screen } from '@testing-library/react';
import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import { SessionEnding } from '#web/session/session-ending.tsx';

const minute = 60_000;

beforeEach(() => {
  vi.useFakeTimers({ now: Date.parse('2026-03-17T08:00:00Z') });
});
afterEach(() => {
  cleanup();
  vi.useRealTimers();
});

test('session – ten minutes before its end – says so and offers to stay signed in, not earlier', () => {
  const session = {
    member: { id: '', name: 'Ingrid', email: 'ingrid@demo.example', roles: [] },
    team: { id: '', name: 'Drive Electronics' },
    allowed: [],
    expiresAt: '2026-03-17T08:30:00Z',
  };
  render(
    <QueryClientProvider client={new QueryClient()}>
      <SessionEnding session={session} />
    </QueryClientProvider>,
  );
  act(() => {
    vi.advanceTimersByTime(19 * minute);
  });
  expect(screen.queryByRole('button', { name: 'Stay signed in' })).not.toBeInTheDocument();
  act(() => {
    vi.advanceTimersByTime(1 * minute);
  });
  expect(screen.getByRole('status')).toHaveTextContent(/Your session ends at/);
  expect(screen.getByRole('button', { name: 'Stay signed in' })).toBeInTheDocument();
});
