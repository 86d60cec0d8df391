import type TestAgent from 'supertest/lib/agent.js';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { idOf, newDraft, newProject } from './people.js';
import { owner, startService, type RevisionBody, type Service } from './service.js';
import { shed } from './shed.js';

let service: Service;
let ada: TestAgent;
let project: string;
beforeAll(async () => {
  service = await startService();
  ada = await owner(service);
  project = await newProject(ada);
});
afterAll(() => service.stop());

const save = (draft: string, version: number, building: unknown) =>
  ada
    .put(`${draft}/building`)
    .set('content-type', 'application/json')
    .set('if-match', `"${version}"`)
    .send(JSON.stringify(building));

describe('saving', () => {
  test('replaces demands, analysis, summary and hash together', async () => {
    const draft = await newDraft(ada, project, shed({ force: 24 }));
    const before = (await ada.get(draft).expect(200)).body as RevisionBody;
    const shear = async () => {
      const query = { member: '1/roof', quantity: 'shear', case: 'EY', sense: '1' };
      const answer = await ada.get(`${draft}/demands`).query(query).expect(200);
      return (answer.body as { demands: { value: number }[] }).demands.map(({ value }) => value);
    };
    expect(await shear()).toEqual([12]);
    const saved = (await save(draft, before.version, shed({ force: 30 })).expect(200)).body as RevisionBody;
    expect(saved.hash).not.toBe(before.hash);
    expect(await shear()).toEqual([15]);
    const again = (await save(draft, saved.version, shed({ force: 24 })).expect(200)).body as RevisionBody;
    expect(again.hash).toBe(before.hash);
  });

  test('the same building in another order of keys has the same hash', async () => {
    const building = shed();
    const turned = Object.fromEntries(Object.entries(building).reverse());
    const [one, other] = [await newDraft(ada, project, building), await newDraft(ada, project, turned)];
    const hash = async (draft: string) => ((await ada.get(draft).expect(200)).body as RevisionBody).hash;
    expect(await hash(other)).toBe(await hash(one));
  });

  test.each([
    ['a zero character in a name', { ...shed(), name: 'Shed\u0000' }, 'wrong-value', 'name'],
    ['half a character pair in a name', { ...shed(), name: 'Shed \ud83d' }, 'wrong-value', 'name'],
    ['a list', [], 'wrong-type', ''],
    ['null', null, 'wrong-type', ''],
    ['a number that is none', JSON.stringify(shed()).replace('"force":24', '"force":NaN'), 'not-json', ''],
    [
      'a level without a wall line in a direction',
      { ...shed(), wallLines: shed().wallLines.slice(0, 3) },
      'too-few-lines',
      'levels[1].diaphragms[0]',
    ],
  ])('%s is a fault with its place; what was saved stays', async (_, building, code, path) => {
    const draft = await newDraft(ada, project, shed());
    const before = (await ada.get(draft).expect(200)).body as RevisionBody;
    const text = typeof building === 'string' ? building : JSON.stringify(building);
    const answer = await ada
      .put(`${draft}/building`)
      .set('content-type', 'application/json')
      .set('if-match', '"1"')
      .send(text)
      .expect(422);
    expect(answer.body).toMatchObject({
      faults: expect.arrayContaining([expect.objectContaining({ code, path })]) as unknown,
    });
    expect((await ada.get(draft).expect(200)).body).toEqual(before);
    expect((await ada.get(`${draft}/building`).expect(200)).body).toEqual(shed());
  });

  test('a number with a long fraction comes back to the last bit', async () => {
    const building = shed({ force: 0.1 + 0.2 });
    const draft = await newDraft(ada, project, building);
    expect((await ada.get(`${draft}/building`).expect(200)).body).toEqual(building);
  });

  test('a download has the name of the building and of its revision', async () => {
    const draft = await newDraft(ada, project, shed({ name: 'Hütte "3"/B' }));
    const { number } = (await ada.get(draft).expect(200)).body as RevisionBody;
    const answer = await ada.get(`${draft}/building?download=1`).expect(200);
    expect(answer.headers['content-disposition']).toBe(
      `attachment; filename*=UTF-8''${encodeURIComponent(`Hütte 3B ${number}`)}.json`,
    );
  });

  test('revisions that are made at once get numbers of their own', async () => {
    const other = await newProject(ada, 'Numbers');
    await Promise.all(Array.from({ length: 6 }, () => newDraft(ada, other, shed())));
    const list = (await ada.get(`/api/projects/${other}/revisions`).expect(200)).body as RevisionBody[];
    expect(list.map(({ number }) => number)).toEqual([1, 2, 3, 4, 5, 6]);
  });
});

describe('issuing', () => {
  const issue = (draft: string, version: number) =>
    ada.post(`${draft}/issue`).set('if-match', `"${version}"`).send({ purpose: 'For a check' });

  test('a draft that an issued revision was made from stays', async () => {
    const draft = await newDraft(ada, project, shed());
    const made = await ada
      .post(`/api/projects/${project}/revisions`)
      .send({ name: 'Next', from: idOf(draft) })
      .expect(201);
    await issue(`/api/projects/${project}/revisions/${(made.body as RevisionBody).id}`, 1).expect(200);
    const answer = await ada.delete(draft).set('if-match', '"1"').expect(409);
    expect(answer.body).toMatchObject({ code: 'followed' });
    await ada.get(draft).expect(200);
  });

  test('of a save and an issue at once, one is taken', async () => {
    const draft = await newDraft(ada, project, shed());
    const answers = await Promise.all([save(draft, 1, shed({ force: 30 })), issue(draft, 1)]);
    const statuses = answers.map(({ status }) => status).sort();
    expect(statuses[0]).toBe(200);
    expect([409, 412]).toContain(statuses[1]);
    const [row] = (
      await service.sql.query<{ shear: number; state: string }>(
        `SELECT "value" AS "shear", "state" FROM "demand" JOIN "revision" ON "id" = "revision_id"
         WHERE "revision_id" = $1 AND "member" = '1/roof' AND "quantity" = 'shear' AND "case" = 'EY' AND "sense" = 1`,
        [idOf(draft)],
      )
    ).rows;
    expect(row).toEqual(answers[0].status === 200 ? { shear: 15, state: 'draft' } : { shear: 12, state: 'issued' });
  });

  test('in the database, results written while the revision is being issued are refused', async () => {
    const draft = await newDraft(ada, project, shed());
    const [issuing, writing] = [await service.sql.connect(), await service.sql.connect()];
    try {
      await issuing.query('BEGIN');
      await issuing.query(`UPDATE "revision" SET "state" = 'issued' WHERE "id" = $1`, [idOf(draft)]);
      const written = writing.query('UPDATE "demand" SET "value" = 0 WHERE "revision_id" = $1', [idOf(draft)]);
      const outcome = expect(written).rejects.toThrow(/issued revision cannot change/);
      await waitUntilBlocked();
      await issuing.query('COMMIT');
      await outcome;
    } finally {
      issuing.release();
      writing.release();
    }
  });

  async function waitUntilBlocked(): Promise<void> {
    for (let i = 0; i < 200; i++) {
      const { rows } = await service.sql.query(
        `SELECT 1 FROM pg_stat_activity WHERE datname = current_database() AND wait_event_type = 'Lock'`,
      );
      if (rows.length > 0) return;
      await new Promise((resolve) => setTimeout(resolve, 25));
    }
    throw new Error('Nobody waits.');
  }
});
