import { beforeAll, describe, expect, test } from 'vitest';
import { allowedRevisionActions, refusal, type RevisionAction, revisionRules } from '#core/review/permissions.ts';
import { type RevisionState, revisionState } from '#core/review/revision-state.ts';
import type { Role } from '#core/review/role.ts';
import { testDatabase } from '../support/database.ts';
import { newRevision, solve, versionOf } from '../support/revision-steps.ts';
import { addTeam, type Agent, allRoles, openService, password, type Service } from '../support/service.ts';
import { tinyBoard } from '../support/tiny-board.ts';

const database = testDatabase();
let service: Service;
let resultId: string;
const agents = new Map<Role, Agent>();
const agentOf = (role: Role) => agents.get(role)!;

beforeAll(async () => {
  service = openService(database);
  const team = await addTeam(service, database, 'Table');
  for (const role of allRoles) agents.set(role, await team.signIn(role));
  // Every revision of this file has the same sketch, so one result is that of all of them.
  const { revisionId } = await newRevision(agentOf('layout-designer'));
  await solve(agentOf('layout-designer'), service, revisionId);
  ({ id: resultId } = await database.knex('results').first('id'));
});

/** A revision drawn by the layout designer, put into a state. */
async function revisionIn(state: RevisionState) {
  const made = await newRevision(agentOf('layout-designer'));
  await database.knex('revisions').where({ id: made.revisionId }).update({ state, result_id: resultId });
  return made;
}

async function act(action: RevisionAction, agent: Agent, at: { assemblyId: string; revisionId: string }) {
  const revision = `/api/v1/revisions/${at.revisionId}`;
  const version = await versionOf(agent, at.revisionId);
  switch (action) {
    case 'edit':
      return agent.put(`${revision}/sketch`).set('If-Match', version).send(tinyBoard());
    case 'solve':
      return agent.post(`${revision}/solve`).send({});
    case 'comment':
      return agent.post(`${revision}/comments`).send({ text: 'Seen.' });
    case 'open-next':
      return agent.post(`/api/v1/assemblies/${at.assemblyId}/revisions`).send({ from: at.revisionId });
    case 'submit':
      return agent.post(`${revision}/submit`).set('If-Match', version).send({ reasons: [] });
    case 'clear':
    case 'issue':
      return agent.post(`${revision}/${action}`).set('If-Match', version).send({ password });
    case 'send-back':
    case 'withdraw':
      return agent.post(`${revision}/${action}`).set('If-Match', version).send({ reason: 'For the test.' });
  }
}

const expected = { role: [403, 'role'], state: [409, 'state'], author: [403, 'author'] } as const;

describe.each(Object.keys(revisionRules) as RevisionAction[])('%s', (action) => {
  test.each(revisionState.options)('in state %s – every role – gets what the table says', async (state) => {
    let shared = await revisionIn(state);
    for (const role of allRoles) {
      const refused = refusal(action, [role], state, role === 'layout-designer');
      const answer = await act(action, agentOf(role), shared);
      if (refused) {
        expect([answer.status, answer.body.code], role).toEqual(expected[refused]);
        continue;
      }
      expect([200, 201, 202], `${role}: ${JSON.stringify(answer.body)}`).toContain(answer.status);
      shared = await revisionIn(state);
    }
  });
});

test.each(revisionState.options)(
  'in state %s – what a revision says is allowed – is what the table says',
  async (state) => {
    const { revisionId } = await revisionIn(state);
    for (const role of allRoles) {
      const { body } = await agentOf(role).get(`/api/v1/revisions/${revisionId}`);
      expect(body.allowed, role).toEqual(allowedRevisionActions([role], state, role === 'layout-designer'));
    }
  },
);
