import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import type { Part } from '#core/board/part.ts';
import type { Role } from '#core/review/role.ts';

export const demoTeam = 'Brackwater Instruments';

export type DemoPerson = { name: string; email: string; role: string; roles: Role[]; password: string };
export type Demo = { people: DemoPerson[]; parts: Record<string, Part>; boards: Record<'a' | 'b' | 'small', unknown> };

/** The invented scenario, from db/seeds/demo below the project's folder. */
export function readDemo(): Demo {
  const read = (name: string): unknown => JSON.parse(readFileSync(resolve('db/seeds/demo', name), 'utf8'));
  return {
    people: read('sign-ins.json') as DemoPerson[],
    parts: read('parts.json') as Record<string, Part>,
    boards: {
      a: read('pca-0617-revision-a.json'),
      b: read('pca-0617-revision-b.json'),
      small: read('pca-0702-revision-a.json'),
    },
  };
}
