import type { Database } from './database.ts';

/** Everybody who saved a version of the revision's sketch or submitted it, in order of their first doing. */
export async function authorsOf(database: Database, revisionId: string): Promise<{ id: string; name: string }[]> {
  const { rows } = await database.raw<{ rows: { id: string; name: string }[] }>(
    `select m.id, m.name
     from (
       select saved_by as member_id, saved_at as at from sketch_versions where revision_id = :revisionId
       union all
       select member_id, signed_at from signatures where revision_id = :revisionId and meaning = 'authored'
     ) as done
     join members m on m.id = done.member_id
     group by m.id, m.name
     order by min(done.at), m.name`,
    { revisionId },
  );
  return rows;
}
