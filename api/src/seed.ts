/** The demo: one project with its revisions, put in once. */
import { readFile } from 'node:fs/promises';
import { readBuildingText } from '@groundward/engine/building/read';
import { AccessService } from './access/access.service.js';
import { DatabaseService } from './database/database.service.js';
import { check, RevisionsService } from './revisions/revisions.service.js';

type Story = { readonly file: string; readonly name: string; readonly purpose: string; readonly remarks: string };

const DEMO = new URL('../../prisma/demo/', import.meta.url);

/** @param options.databaseUrl a migrated database; a demo that is there already, or was deleted, stays as it is */
export async function seed({ databaseUrl }: { readonly databaseUrl: string }): Promise<void> {
  const database = new DatabaseService(databaseUrl);
  try {
    const { prisma } = database;
    if ((await prisma.project.count()) > 0 || (await prisma.user.count()) > 0) return;
    const story = JSON.parse(await readFile(new URL('revisions.json', DEMO), 'utf8')) as Story[];
    const project = await prisma.project.create({ data: { name: 'Demo: Ropewalk Yard, House 2', demo: true } });
    const revisions = new RevisionsService(database, new AccessService(database));
    let basedOn: string | null = null;
    for (const [i, { file, name, purpose, remarks }] of story.entries()) {
      const checked = check(readBuildingText(await readFile(new URL(file, DEMO), 'utf8')));
      const revision = await revisions.insert(project.id, { name, createdBy: 'Demo', basedOn }, checked);
      const last = i === story.length - 1;
      await prisma.revision.update({
        where: { id: revision.id },
        data: last ? { remarks } : { state: 'issued', issuedAt: new Date(), purpose, remarks },
      });
      basedOn = revision.id;
    }
  } finally {
    await database.onModuleDestroy();
  }
}
