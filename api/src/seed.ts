/** The demo: one project with its revisions, put in once. */
import { readFile } from 'node:fs/promises';
import { AccessService } from './access/access.service.js';
import { asRequest, setActor } from './database/actor.js';
import { DatabaseService } from './database/database.service.js';
import { EngineService } from './engine/engine.service.js';
import { RevisionsService, sound } from './revisions/revisions.service.js';

type Chapter = { readonly file: string; readonly name: string; readonly purpose: string; readonly remarks: string };

const DEMO = new URL('../../prisma/demo/', import.meta.url);

/** One process at a time puts the demo in. */
const LOCK = 7_426_911;

/**
 * Puts the demo in, as long as nobody has an account; one that was broken off is completed. Whatever people made of
 * it, or that they deleted it, stays as it is.
 *
 * @param options.databaseUrl a migrated database
 */
export async function seed({ databaseUrl }: { readonly databaseUrl: string }): Promise<void> {
  const database = new DatabaseService(databaseUrl);
  const engine = new EngineService();
  try {
    if (await isSettled(database)) return;
    const lock = await database.pool.connect();
    try {
      await lock.query('SELECT pg_advisory_lock($1)', [LOCK]);
      if (!(await isSettled(database))) {
        await asRequest(() => {
          setActor({ id: '', name: 'Demo' });
          return putIn(database, engine);
        });
      }
    } finally {
      // Ends the session, and with it the lock.
      lock.release(true);
    }
  } finally {
    await engine.onModuleDestroy();
    await database.onModuleDestroy();
  }
}

/** Somebody is in, or somebody's project is there. */
async function isSettled({ prisma }: DatabaseService): Promise<boolean> {
  return (await prisma.user.count()) > 0 || (await prisma.project.count({ where: { demo: false } })) > 0;
}

async function putIn(database: DatabaseService, engine: EngineService): Promise<void> {
  const { prisma } = database;
  const story = JSON.parse(await readFile(new URL('revisions.json', DEMO), 'utf8')) as Chapter[];
  const project =
    (await prisma.project.findFirst({ where: { demo: true } })) ??
    (await database.write((transaction) =>
      transaction.project.create({ data: { name: 'Demo: Ropewalk Yard, House 2', demo: true } }),
    ));
  const there = await prisma.revision.findMany({
    where: { projectId: project.id },
    orderBy: { number: 'asc' },
    select: { id: true, state: true },
  });
  const revisions = new RevisionsService(database, new AccessService(database), engine);
  let basedOn: string | null = null;
  for (const [i, { file, name, purpose, remarks }] of story.entries()) {
    let revision: { readonly id: string; readonly state: 'draft' | 'issued' } | undefined = there[i];
    if (revision === undefined) {
      const text = await readFile(new URL(file, DEMO), 'utf8');
      const checked = sound(await engine.run('check', { text }));
      revision = await revisions.insert(project.id, { name, createdBy: 'Demo', basedOn }, checked);
    }
    const last = i === story.length - 1;
    if (revision.state === 'draft') {
      const { id } = revision;
      await database.write((transaction) =>
        transaction.revision.update({
          where: { id },
          data: last ? { remarks } : { state: 'issued', issuedAt: new Date(), purpose, remarks },
        }),
      );
    }
    basedOn = revision.id;
  }
}
