import { useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import type { SessionView } from '#core/contract/people.ts';
import { sessionKey } from './session-query.ts';

/** Takes up a new session: nothing that was read for somebody else stays, then the page `to` opens. */
export function useEnterSession() {
  const client = useQueryClient();
  const navigate = useNavigate();
  return (session: SessionView, to: string) => {
    client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== sessionKey[0] });
    client.setQueryData(sessionKey, session);
    void navigate(to, { replace: true });
  };
}
