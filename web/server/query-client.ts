import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';
import { sessionKey } from '#web/session/session-query.ts';
import { ProblemError } from './problem-error.ts';

/** One client per page load; a 401 anywhere means that the session has ended. */
export function createQueryClient(): QueryClient {
  const endSession = (error: Error) => {
    if (error instanceof ProblemError && error.status === 401 && client.getQueryData(sessionKey)) {
      client.setQueryData(sessionKey, null);
    }
  };
  const client: QueryClient = new QueryClient({
    queryCache: new QueryCache({ onError: endSession }),
    mutationCache: new MutationCache({ onError: endSession }),
    defaultOptions: {
      // Offline is told as a problem with a way to try again, not as an endless wait.
      queries: {
        networkMode: 'always',
        staleTime: 10_000,
        retry: mayHelp,
        retryDelay: (attempt) => 400 * 2 ** attempt,
      },
      mutations: { networkMode: 'always' },
    },
  });
  return client;
}

function mayHelp(failures: number, error: Error): boolean {
  const passing = error instanceof ProblemError && [0, 502, 503, 504].includes(error.status);
  return passing && failures < 2;
}

export const queryClient = createQueryClient();
