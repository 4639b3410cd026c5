import { beforeAll, expect, test } from 'vitest';
import { testDatabase } from '../support/database.ts';
import { newRevision } from '../support/revision-steps.ts';
import { addTeam, type Agent, openService, type Service, type Team } from '../support/service.ts';
import { tinyBoard } from '../support/tiny-board.ts';

const database = testDatabase();
let service: Service;
let team: Team;
let designer: Agent;
let lead: Agent;
beforeAll(async () => {
  service = openService(database);
  team = await addTeam(service, database, 'Sketch');
  designer = await team.signIn('layout-designer');
  lead = await team.signIn('hardware-lead');
});

const sketch = (revisionId: string) => `/api/v1/revisions/${revisionId}/sketch`;

test('a save – over the present version – gives the next one, and keeps the document as it was written', async () => {
  const { revisionId } = await newRevision(designer);
  const board = tinyBoard(0.3, 'Second');
  const saved = await designer.put(sketch(revisionId)).set('If-Match', '"1"').send(board).expect(200);
  expect(saved.body.version).toBe(2);
  const read = await designer.get(sketch(revisionId)).expect(200);
  expect(read.body.board).toEqual(board);
  expect(read.headers.etag).toBe('"2"');
  const versions = await designer.get(`${sketch(revisionId)}/versions`).expect(200);
  expect(versions.body.items.map(({ version }: { version: number }) => version)).toEqual([2, 1]);
});

test('a save – without If-Match – is refused', async () => {
  const { revisionId } = await newRevision(designer);
  await designer.put(sketch(revisionId)).send(tinyBoard()).expect(428);
});

test('a save – over an old version – says who saved and when, and stores nothing', async () => {
  const { revisionId } = await newRevision(designer);
  await lead.put(sketch(revisionId)).set('If-Match', '"1"').send(tinyBoard(0.4)).expect(200);
  const stale = await designer.put(sketch(revisionId)).set('If-Match', '"1"').send(tinyBoard(0.5)).expect(412);
  expect(stale.body.current).toMatchObject({ version: 2, savedBy: 'hardware-lead' });
  const read = await designer.get(sketch(revisionId));
  expect(read.body.board.regulators[0].powerW).toBe(0.4);
});

test('two saves at once – twelve times over – exactly one wins, the other learns who did', async () => {
  const { revisionId } = await newRevision(designer);
  for (let version = 1; version <= 12; version++) {
    const save = (agent: Agent, powerW: number) =>
      agent.put(sketch(revisionId)).set('If-Match', `"${version}"`).send(tinyBoard(powerW));
    const both = await Promise.all([save(designer, 0.6), save(lead, 0.7)]);
    const lost = both.find(({ status }) => status !== 200);
    expect(both.map(({ status }) => status).sort((a, b) => a - b)).toEqual([200, 412]);
    expect(lost?.body.current).toMatchObject({
      version: version + 1,
      savedBy: lost === both[0] ? 'hardware-lead' : 'layout-designer',
    });
  }
  const versions = await designer.get(`${sketch(revisionId)}/versions`).expect(200);
  expect(versions.body.items).toHaveLength(13);
});

test('a save whose answer was lost – sent again – is answered as the first time', async () => {
  const { revisionId } = await newRevision(designer);
  const first = await designer.put(sketch(revisionId)).set('If-Match', '"1"').send(tinyBoard(0.8)).expect(200);
  const again = await designer.put(sketch(revisionId)).set('If-Match', '"1"').send(tinyBoard(0.8)).expect(200);
  expect(again.body).toEqual(first.body);
});

test('an invalid board – every fault with its path – stores nothing', async () => {
  const { revisionId } = await newRevision(designer);
  const board = tinyBoard();
  const broken = { ...board, regulators: [{ ...board.regulators[0], part: 'none', at: [10, 1e9] }], colour: 'green' };
  const refused = await designer.put(sketch(revisionId)).set('If-Match', '"1"').send(broken).expect(422);
  const paths = refused.body.faults.map(({ path }: { path: string }) => path);
  expect(paths).toEqual(expect.arrayContaining(['regulators[0].at[1]', 'colour']));
  expect((await designer.get(`/api/v1/revisions/${revisionId}`)).body.version).toBe(1);
});

test('creating – twice with one Idempotency-Key – makes one assembly', async () => {
  const body = { number: 'IDEM-1', title: 'Once' };
  const send = () => designer.post('/api/v1/assemblies').set('Idempotency-Key', 'a-key-of-the-tests-0001').send(body);
  const [first, second] = [await send(), await send()];
  expect([first.status, second.status]).toEqual([201, 201]);
  expect(second.body.id).toBe(first.body.id);
  // Also while the first one is still under way: neither is turned away, and there is one assembly.
  const both = await Promise.all(
    ['', ''].map(() =>
      designer
        .post('/api/v1/assemblies')
        .set('Idempotency-Key', 'a-key-of-the-tests-0002')
        .send({ ...body, number: 'IDEM-2' }),
    ),
  );
  expect(both.map(({ status }) => status)).toEqual([201, 201]);
  expect(both[0]!.body).toEqual(both[1]!.body);
  const other = await designer
    .post('/api/v1/assemblies')
    .set('Idempotency-Key', 'a-key-of-the-tests-0001')
    .send({ ...body, title: 'Other' });
  expect(other.status).toBe(422);
});
