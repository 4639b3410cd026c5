import { redirect } from 'react-router-dom';
import { paths } from '#web/paths.ts';
import { queryClient } from '#web/server/query-client.ts';
import { sessionQuery } from './session-query.ts';

/** Loader of every page behind the sign-in. */
export async function requireSession({ request }: { request: Request }): Promise<null> {
  const session = await queryClient.ensureQueryData(sessionQuery);
  if (session) return null;
  const { pathname, search } = new URL(request.url);
  throw redirect(paths.signIn(pathname + search));
}
