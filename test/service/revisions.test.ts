import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type TestAgent from 'supertest/lib/agent.js';
import { canonicalBuilding } from '@groundward/engine/building/canonical';
import type { Building } from '@groundward/engine/building/definition';
import { compareWithCauses } from '@groundward/engine/compare/causes';
import { compare } from '@groundward/engine/compare/compare';
import type { Change } from '@groundward/engine/compare/result';
import { foundation } from '@groundward/engine/foundation/foundation';
import { foundationCsv } from '@groundward/engine/foundation/csv';
import { analyse } from '@groundward/engine/path/analyse';
import { trace } from '@groundward/engine/path/trace';
import type { Analysis, Demand } from '@groundward/engine/path/result';
import { main } from '../../engine/command/groundward.js';
import { demoFile, owner, startService, type RevisionBody, type Service } from './service.js';

let service: Service;
let ada: TestAgent;
let project: string;
let revisions: RevisionBody[];
const at = (i: number): string => `/api/projects/${project}/revisions/${revisions[i]?.id ?? ''}`;

function analysed(building: Building): Analysis {
  const result = analyse(building);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result.value;
}

beforeAll(async () => {
  service = await startService({ demo: true });
  ada = await owner(service);
  project = ((await ada.get('/api/projects').expect(200)).body as { id: string }[])[0]?.id ?? '';
  revisions = (await ada.get(`/api/projects/${project}/revisions`).expect(200)).body as RevisionBody[];
});
afterAll(() => service.stop());

describe('the demo', () => {
  test('three revisions: two issued, one draft, each with the hash of its building', async () => {
    expect(revisions.map(({ number, state }) => [number, state])).toEqual([
      [1, 'issued'],
      [2, 'issued'],
      [3, 'draft'],
    ]);
    for (const [i, name] of ['1-first-design', '2-client-changes', '3-engineers-answer'].entries()) {
      const saved = (await ada.get(`${at(i)}/building`).expect(200)).body as Building;
      expect(saved).toEqual(JSON.parse(demoFile(name)));
      expect(createHash('sha256').update(canonicalBuilding(saved)).digest('hex')).toBe(revisions[i]?.hash);
    }
  });

  test('the stored analysis is what the engine gives, row for row', async () => {
    const stored = (await ada.get(`${at(0)}/analysis`).expect(200)).body as Analysis;
    expect(stored).toEqual(JSON.parse(JSON.stringify(analysed(JSON.parse(demoFile('1-first-design')) as Building))));
  });
});

describe('reading', () => {
  test('demands by member, level, quantity, case and sense, page by page', async () => {
    const query = { level: 'L2', kind: 'pier', quantity: 'shear', case: 'EX', sense: '1' };
    const first = (
      await ada
        .get(`${at(0)}/demands`)
        .query({ ...query, limit: 5 })
        .expect(200)
    ).body as { demands: Demand[]; next: number };
    expect(first.demands).toHaveLength(5);
    const rest = (
      await ada
        .get(`${at(0)}/demands`)
        .query({ ...query, after: first.next })
        .expect(200)
    ).body as { demands: Demand[]; next: null };
    expect(rest.next).toBeNull();
    const all = [...first.demands, ...rest.demands];
    for (const row of all) {
      expect(row).toMatchObject({ kind: 'pier', quantity: 'shear', case: 'EX', sense: 1 });
      expect(row.member.split('/')[1]).toBe('L2');
    }
    expect(new Set(all.map((row) => row.member)).size).toBe(all.length);
    const one = (
      await ada
        .get(`${at(0)}/demands`)
        .query({ member: 'A/L2/Ac', quantity: 'end-tension', combination: '0.6D+0.7E' })
        .expect(200)
    ).body as { demands: Demand[] };
    expect(new Set(one.demands.map((row) => row.combination))).toEqual(new Set(['0.6D+0.7E']));
    await ada
      .get(`${at(0)}/demands`)
      .query({ kind: 'wall' })
      .expect(400);
  });

  test('trace, foundation, its CSV and comparison are the engine’s own', async () => {
    const building = JSON.parse(demoFile('1-first-design')) as Building;
    const analysis = analysed(building);
    const traced = trace(building, '3/L2', 'EY');
    const answer = await ada
      .get(`${at(0)}/trace`)
      .query({ member: '3/L2', case: 'EY' })
      .expect(200);
    expect(answer.body).toEqual(traced.ok ? traced.value : undefined);
    await ada
      .get(`${at(0)}/trace`)
      .query({ member: 'nothing', case: 'EY' })
      .expect(404);
    const expected = foundation(building, analysis);
    expect((await ada.get(`${at(0)}/foundation`).expect(200)).body).toEqual(JSON.parse(JSON.stringify(expected)));
    const csv = await ada.get(`${at(0)}/foundation.csv`).expect(200);
    expect(csv.headers['content-type']).toContain('text/csv');
    expect(csv.text).toBe(foundationCsv(expected));
    const later = JSON.parse(demoFile('2-client-changes')) as Building;
    const comparison = compare({ building, analysis }, { building: later, analysis: analysed(later) });
    const found = (
      await ada
        .get(`/api/projects/${project}/compare`)
        .query({ before: revisions[0]?.id, after: revisions[1]?.id })
        .expect(200)
    ).body as typeof comparison;
    expect(found.changes).toEqual(JSON.parse(JSON.stringify(comparison.changes)));
    expect(found.edits.map((edit) => edit.what).sort()).toEqual(comparison.edits.map((edit) => edit.what).sort());
  });

  test('the working of a demand: the bytes that the command line prints', async () => {
    const asked = { member: '3/L2', quantity: 'shear', case: 'EY/+e', sense: '-1' };
    const answer = await ada
      .get(`${at(0)}/working`)
      .query(asked)
      .expect(200);
    let printed = '';
    const words = ['--case', asked.case, '--sense', asked.sense, '--json'];
    const code = await main(['explain', '-', asked.member, asked.quantity, ...words], {
      readFile: () => Promise.reject(new Error('no file')),
      readStdin: () => Promise.resolve(demoFile('1-first-design')),
      out: (text) => (printed += text),
      err: () => undefined,
    });
    expect(code).toBe(0);
    expect(`${answer.text}\n`).toBe(printed);
    const chosen = await ada
      .get(`${at(0)}/working`)
      .query({ member: '1/L2/1a', quantity: 'end-tension', combination: '0.6D+0.7E' })
      .expect(200);
    expect((chosen.body as { demand: Demand }).demand).toMatchObject({ sense: 1, combination: '0.6D+0.7E' });
    const missing = await ada
      .get(`${at(0)}/working`)
      .query({ ...asked, member: 'nothing' })
      .expect(404);
    expect((missing.body as { detail: string }).detail).toContain('no demand of member nothing');
    await ada
      .get(`${at(0)}/working`)
      .query({ ...asked, quantity: 'colour' })
      .expect(400);
  });

  test('causes on request: the same shares as the engine’s own, asked twice and worked out once', async () => {
    const [before, after] = ['2-client-changes', '3-engineers-answer'].map(
      (name) => JSON.parse(demoFile(name)) as Building,
    ) as [Building, Building];
    const expected = compareWithCauses(
      { building: before, analysis: analysed(before) },
      { building: after, analysis: analysed(after) },
    );
    const ask = () =>
      ada
        .get(`/api/projects/${project}/compare`)
        .query({ before: revisions[1]?.id, after: revisions[2]?.id, causes: 'true' })
        .expect(200);
    const [first, second] = await Promise.all([ask(), ask()]);
    const found = first.body as typeof expected;
    expect(found.method).toEqual({ kind: 'exact' });
    expect(found.edits.map((edit) => edit.what).sort()).toEqual(expected.edits.map((edit) => edit.what).sort());
    const told = new Map(found.edits.map(({ id, what }) => [id, what]));
    const what = new Map(expected.edits.map(({ id, what: said }) => [id, said]));
    const shares = (change: Change, edits: ReadonlyMap<string, string>) =>
      new Map(change.causes.map(({ edit, share }) => [edits.get(edit), share]));
    expect(found.changes.length).toBe(expected.changes.length);
    found.changes.forEach((change, i) => {
      const own = shares(expected.changes[i] as Change, what);
      for (const [edit, share] of shares(change, told)) expect(share).toBeCloseTo(own.get(edit) ?? 0, 9);
    });
    expect(second.text).toBe(first.text);
  });

  test('history of a demand across all revisions', async () => {
    const history = (
      await ada
        .get(`/api/projects/${project}/history`)
        .query({ member: 'B/L2/Bd', quantity: 'shear', case: 'EX', sense: '1' })
        .expect(200)
    ).body as { unit: string; points: { number: number; value: number | null }[] };
    expect(history.unit).toBe('kN');
    expect(history.points.map((point) => point.number)).toEqual([1, 2, 3]);
    expect(history.points[0]?.value).toBeNull();
    expect(history.points[1]?.value).toBeNull();
    expect(history.points[2]?.value).toBeGreaterThan(0);
  });
});

describe('writing', () => {
  const widened = (): string =>
    demoFile('3-engineers-answer').replace('"Ropewalk Yard, House 2"', '"Ropewalk Yard, House 2, tried"');

  test('a write names the version that it saw', async () => {
    await ada
      .put(`${at(2)}/building`)
      .set('content-type', 'application/json')
      .send(widened())
      .expect(428);
    await ada
      .put(`${at(2)}/building`)
      .set('content-type', 'application/json')
      .set('if-match', 'three')
      .send(widened())
      .expect(400);
    const before = await ada.get(at(2)).expect(200);
    expect(before.headers['etag']).toBe(`"${(before.body as RevisionBody).version}"`);
    const saved = await ada
      .put(`${at(2)}/building`)
      .set('content-type', 'application/json')
      .set('if-match', before.headers['etag'] ?? '')
      .send(widened())
      .expect(200);
    expect((saved.body as RevisionBody).version).toBe((before.body as RevisionBody).version + 1);
    expect((saved.body as RevisionBody).hash).not.toBe((before.body as RevisionBody).hash);
    const stale = await ada
      .put(`${at(2)}/building`)
      .set('content-type', 'application/json')
      .set('if-match', before.headers['etag'] ?? '')
      .send(demoFile('3-engineers-answer'))
      .expect(412);
    expect(stale.headers['content-type']).toContain('application/problem+json');
    expect(stale.body).toMatchObject({
      code: 'stale',
      current: { building: { name: 'Ropewalk Yard, House 2, tried' } },
    });
    expect(((await ada.get(`${at(2)}/building`)).body as Building).name).toBe('Ropewalk Yard, House 2, tried');
  });

  test('of several saves at once on one version, one is taken and the others are told so', async () => {
    const { version } = (await ada.get(at(2)).expect(200)).body as RevisionBody;
    const answers = await Promise.all(
      [1, 2, 3, 4].map((i) =>
        ada
          .put(`${at(2)}/building`)
          .set('content-type', 'application/json')
          .set('if-match', `"${version}"`)
          .send(widened().replace('tried', `tried ${i}`)),
      ),
    );
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, 412, 412, 412]);
    expect(((await ada.get(at(2)).expect(200)).body as RevisionBody).version).toBe(version + 1);
  });

  test.each([
    ['a file that is not JSON', '{"schema": ', 422, 'not-json', ''],
    ['an empty file', '', 422, 'empty', ''],
    ['an unknown key', widened().replace('"units"', '"unts": 1, "units"'), 422, 'unknown-key', 'unts'],
    [
      'an outline that crosses itself',
      widened().replace('[30, 0],', '[30, 0], [-5, 5],'),
      422,
      'outline-crosses-itself',
      'levels[1].diaphragms[0].outline',
    ],
    [
      'a building of one line',
      JSON.stringify({
        ...(JSON.parse(widened()) as Building),
        wallLines: (JSON.parse(widened()) as Building).wallLines.filter((line) => 'A123456'.includes(line.id)),
      }),
      422,
      'too-few-lines',
      'levels[4].diaphragms[0]',
    ],
  ])(
    '%s: a problem with the engine’s code, path, found and expected; the saved building stays',
    async (_, text, status, code, path) => {
      const before = (await ada.get(at(2)).expect(200)).body as RevisionBody;
      const answer = await ada
        .put(`${at(2)}/building`)
        .set('content-type', 'application/json')
        .set('if-match', `"${before.version}"`)
        .send(text)
        .expect(status);
      const { faults } = answer.body as { faults: { code: string; path: string; found: string; expected: string }[] };
      const fault = faults.find((each) => each.code === code);
      expect(fault?.path).toBe(path);
      expect(fault?.found).toBeTruthy();
      expect(fault?.expected).toBeTruthy();
      expect((await ada.get(at(2)).expect(200)).body).toEqual(before);
    },
  );

  test('a file of 50 MB is refused by its size', async () => {
    const { version } = (await ada.get(at(2)).expect(200)).body as RevisionBody;
    const answer = await ada
      .put(`${at(2)}/building`)
      .set('content-type', 'application/json')
      .set('if-match', `"${version}"`)
      .send(`{"name": "${'x'.repeat(50_000_000)}"}`)
      .expect(413);
    expect(answer.body).toMatchObject({ code: 'too-large' });
    expect(((await ada.get(at(2)).expect(200)).body as RevisionBody).version).toBe(version);
  });

  test('a new draft from the last revision, or from a file; its number is the next', async () => {
    const made = (
      await ada.post(`/api/projects/${project}/revisions`).send({ name: 'Tried', from: revisions[2]?.id }).expect(201)
    ).body as RevisionBody & { basedOn: string };
    expect(made).toMatchObject({ number: 4, state: 'draft', basedOn: revisions[2]?.id });
    await ada
      .post(`/api/projects/${project}/revisions`)
      .send({ name: 'Both', from: revisions[2]?.id, building: {} })
      .expect(400);
    await ada
      .post(`/api/projects/${project}/revisions`)
      .send({ name: 'Bad', building: { schema: 'other' } })
      .expect(422);
    const filed = (
      await ada
        .post(`/api/projects/${project}/revisions`)
        .send({ name: 'Filed', building: JSON.parse(demoFile('1-first-design')) as unknown })
        .expect(201)
    ).body as RevisionBody;
    expect(filed.hash).toBe(revisions[0]?.hash);
    await ada.delete(`/api/projects/${project}/revisions/${filed.id}`).set('if-match', '"1"').expect(204);
    await ada.get(`/api/projects/${project}/revisions/${filed.id}`).expect(404);
  });
});

describe('an issued revision never changes', () => {
  test('by the service', async () => {
    const draft = (
      await ada
        .post(`/api/projects/${project}/revisions`)
        .send({ name: 'To be issued', from: revisions[1]?.id })
        .expect(201)
    ).body as RevisionBody;
    const url = `/api/projects/${project}/revisions/${draft.id}`;
    const issued = (
      await ada
        .post(`${url}/issue`)
        .set('if-match', '"1"')
        .send({ purpose: 'For a check', remarks: 'none' })
        .expect(200)
    ).body as RevisionBody;
    expect(issued).toMatchObject({ state: 'issued', hash: draft.hash });
    const tag = `"${issued.version}"`;
    await ada
      .put(`${url}/building`)
      .set('content-type', 'application/json')
      .set('if-match', tag)
      .send(demoFile('1-first-design'))
      .expect(409);
    await ada.patch(url).set('if-match', tag).send({ name: 'Other' }).expect(409);
    await ada.post(`${url}/issue`).set('if-match', tag).send({ purpose: 'Again' }).expect(409);
    await ada.delete(url).set('if-match', tag).expect(409);
  });

  test.each([
    ['its building', `UPDATE "revision" SET "building" = '{}' WHERE "id" = $1`],
    ['its remarks', `UPDATE "revision" SET "remarks" = 'x' WHERE "id" = $1`],
    ['its state', `UPDATE "revision" SET "state" = 'draft' WHERE "id" = $1`],
    ['itself', `DELETE FROM "revision" WHERE "id" = $1`],
    ['a demand', `UPDATE "demand" SET "value" = 0 WHERE "revision_id" = $1`],
    ['its demands', `DELETE FROM "demand" WHERE "revision_id" = $1`],
    [
      'one demand more',
      `INSERT INTO "demand" SELECT "revision_id", 999999, "project_id", "member", "level", "kind", "quantity", "case", "sense", "combination", 1, "unit", "at_x", "at_y" FROM "demand" WHERE "revision_id" = $1 LIMIT 1`,
    ],
    ['its analysis', `UPDATE "analysis" SET "document" = '{}' WHERE "revision_id" = $1`],
    ['the analysis away', `DELETE FROM "analysis" WHERE "revision_id" = $1`],
  ])('in the database too: %s', async (_, statement) => {
    await expect(service.sql.query(statement, [revisions[0]?.id])).rejects.toThrow(/issued/);
  });

  test('no table of them can be emptied', async () => {
    for (const table of ['revision', 'analysis', 'demand']) {
      await expect(service.sql.query(`TRUNCATE "${table}" CASCADE`)).rejects.toThrow(/cannot be truncated/);
    }
  });

  test('a building changed behind the service’s back is told, not shown', async () => {
    const draft = (
      await ada
        .post(`/api/projects/${project}/revisions`)
        .send({ name: 'Tampered', from: revisions[1]?.id })
        .expect(201)
    ).body as RevisionBody;
    await service.sql.query(
      `UPDATE "revision" SET "building" = jsonb_set("building", '{name}', '"Other"') WHERE "id" = $1`,
      [draft.id],
    );
    const answer = await ada.get(`/api/projects/${project}/revisions/${draft.id}/building`).expect(500);
    expect(answer.body).toMatchObject({ code: 'hash-mismatch' });
  });
});
