import { expect } from 'vitest';
import type { BoardDocument } from '#core/board/document.ts';
import { type Agent, password, type Service } from './service.ts';
import { tinyBoard } from './tiny-board.ts';

let number = 0;

/** A new assembly with this board as revision A. @returns id of the revision */
export async function newRevision(
  designer: Agent,
  board: BoardDocument = tinyBoard(),
): Promise<{ assemblyId: string; revisionId: string }> {
  number += 1;
  const answer = await designer
    .post('/api/v1/assemblies')
    .send({ number: `T-${number}`, title: 'A test', board })
    .expect(201);
  return { assemblyId: answer.body.id, revisionId: answer.body.revisions[0].id };
}

export async function versionOf(agent: Agent, revisionId: string): Promise<string> {
  const answer = await agent.get(`/api/v1/revisions/${revisionId}`).expect(200);
  return `"${answer.body.version}"`;
}

export async function solve(agent: Agent, service: Service, revisionId: string): Promise<void> {
  await agent.post(`/api/v1/revisions/${revisionId}/solve`).send({}).expect(202);
  await service.runJobs();
}

/** One change of state, over the present version. */
export async function change(agent: Agent, revisionId: string, step: string, body: object) {
  return agent
    .post(`/api/v1/revisions/${revisionId}/${step}`)
    .set('If-Match', await versionOf(agent, revisionId))
    .send(body);
}

/** From a solved sketch to an issued revision. */
export async function issue(
  people: { designer: Agent; reviewer: Agent; quality: Agent },
  revisionId: string,
): Promise<void> {
  expect((await change(people.designer, revisionId, 'submit', { reasons: [] })).status).toBe(200);
  expect((await change(people.reviewer, revisionId, 'clear', { password })).status).toBe(200);
  expect((await change(people.quality, revisionId, 'issue', { password })).status).toBe(200);
}
