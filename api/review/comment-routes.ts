import type { CommentView } from '#core/contract/review.ts';
import { place } from '#core/contract/review.ts';
import type { reviewEndpoints } from '#core/contract/review-endpoints.ts';
import { appendAuditEvent } from '#db/audit-events.ts';
import { type Comment, findComment, insertComment, listComments, resolveComment } from '#db/comments.ts';
import type { Database } from '#db/database.ts';
import { notFound } from '../http/refusal.ts';
import type { Routes } from '../http/route.ts';
import { actOnRevision, revisionName } from './act-on-revision.ts';

type Names = Extract<keyof typeof reviewEndpoints, 'listComments' | 'comment' | 'resolveComment'>;

export const commentRoutes: Routes<Names> = {
  listComments: async ({ database, revision }) => ({
    body: { items: (await listComments(database, revision.id)).map(present) },
  }),

  comment: async ({ deps, database, actor, params, body }) =>
    actOnRevision(database, actor, params.revisionId, 'comment', async (trx, revision) => {
      const id = deps.newId();
      await insertComment(trx, { id, revisionId: revision.id, authorId: actor.member.id, ...body });
      await appendAuditEvent(trx, {
        teamId: actor.team.id,
        actor: actor.member,
        kind: 'comment.added',
        subject: revisionName(revision),
        revisionId: revision.id,
        facts: { text: body.text, place: body.place },
      });
      return { body: await read(trx, revision.id, id) };
    }),

  resolveComment: async ({ database, actor, params }) =>
    actOnRevision(database, actor, params.revisionId, 'comment', async (trx, revision) => {
      const comment = await findComment(trx, revision.id, params.commentId);
      if (!comment) throw notFound('This comment');
      if (await resolveComment(trx, comment.id, actor.member.id))
        await appendAuditEvent(trx, {
          teamId: actor.team.id,
          actor: actor.member,
          kind: 'comment.resolved',
          subject: revisionName(revision),
          revisionId: revision.id,
          facts: { text: comment.text, by: comment.author },
        });
      return { body: await read(trx, revision.id, comment.id) };
    }),
};

async function read(database: Database, revisionId: string, id: string): Promise<CommentView> {
  const comment = await findComment(database, revisionId, id);
  if (!comment) throw new Error('a comment just written was not found');
  return present(comment);
}

function present({ id, author, text, place: at, createdAt, resolvedAt, resolvedBy }: Comment): CommentView {
  return {
    id,
    author,
    text,
    place: place.nullable().parse(at),
    createdAt: createdAt.toISOString(),
    resolvedAt: resolvedAt?.toISOString() ?? null,
    resolvedBy,
  };
}
