import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { DatabaseService } from '../../api/dist/database/database.service.js';
import { seed } from '../../api/dist/seed.js';
import { newDatabase, type TestDatabase } from './service.js';

let database: TestDatabase;
beforeEach(async () => {
  database = await newDatabase();
});
afterEach(() => database.drop());

const revisions = async () =>
  (
    await database.sql.query<object>(
      'SELECT "number", "name", "state", "hash", "based_on" IS NOT NULL AS "based" FROM "revision" ORDER BY "number"',
    )
  ).rows;

describe('the demo', () => {
  test('is put in once, whoever starts at the same moment or again', async () => {
    const options = { databaseUrl: database.url };
    await Promise.all([seed(options), seed(options)]);
    const once = await revisions();
    expect(once).toMatchObject([
      { number: 1, state: 'issued', based: false },
      { number: 2, state: 'issued', based: true },
      { number: 3, state: 'draft', based: true },
    ]);
    await seed(options);
    expect(await revisions()).toEqual(once);
  });

  test('that was broken off is completed', async () => {
    await seed({ databaseUrl: database.url });
    const whole = await revisions();
    await database.sql.query('DELETE FROM "revision" WHERE "number" = 3');
    await seed({ databaseUrl: database.url });
    expect(await revisions()).toEqual(whole);
  });

  test('stays away where people are at work', async () => {
    await database.sql.query(`INSERT INTO "user" ("id", "name", "email") VALUES ('1', 'Ada', 'ada@example.org')`);
    await seed({ databaseUrl: database.url });
    expect(await revisions()).toEqual([]);
  });
});

test('the tables have every column that the service reads', async () => {
  const service = new DatabaseService(database.url);
  try {
    const { prisma } = service;
    for (const model of [
      prisma.user,
      prisma.session,
      prisma.account,
      prisma.verification,
      prisma.project,
      prisma.membership,
      prisma.link,
      prisma.revision,
      prisma.analysis,
      prisma.demand,
    ]) {
      expect(await (model as { findFirst: () => Promise<unknown> }).findFirst()).toBeNull();
    }
  } finally {
    await service.onModuleDestroy();
  }
});
