/** Every address inside the application is built here. */
type RevisionView = 'sketch' | 'conditions' | 'rails' | 'results' | 'review' | 'record';
type Search = Record<string, string | null | undefined>;

function withSearch(path: string, search: Search = {}): string {
  const entries = Object.entries(search).filter((entry): entry is [string, string] => Boolean(entry[1]));
  return entries.length > 0 ? `${path}?${new URLSearchParams(entries).toString()}` : path;
}

const revision = (view: RevisionView) => (revisionId: string, search?: Search) =>
  withSearch(`/revisions/${revisionId}/${view}`, search);

export const paths = {
  /** `to`: where to go after signing in. */
  signIn: (to?: string) => withSearch('/sign-in', { to: to === '/' ? null : to }),
  passwordReset: () => '/password-reset',
  assemblies: (search?: Search) => withSearch('/assemblies', search),
  assembly: (assemblyId: string) => `/assemblies/${assemblyId}`,
  sketch: revision('sketch'),
  conditions: revision('conditions'),
  rails: revision('rails'),
  results: revision('results'),
  review: revision('review'),
  record: revision('record'),
  library: (search?: Search) => withSearch('/library', search),
  method: () => '/method',
  team: () => '/team',
  audit: (search?: Search) => withSearch('/audit', search),
  mail: (search?: Search) => withSearch('/mail', search),
  account: () => '/account',
};

/** Only a path of this application may follow a sign-in, never an address from outside. */
export function safeReturn(to: string | null): string {
  return to && /^\/(?![/\\])/.test(to) && !to.startsWith('/sign-in') ? to : paths.assemblies();
}
