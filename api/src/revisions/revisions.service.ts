import { Inject, Injectable } from '@nestjs/common';
import type { Building } from '@groundward/engine/building/definition';
import type { Result } from '@groundward/engine/building/fault';
import type { Analysis } from '@groundward/engine/path/result';
import { AccessService } from '../access/access.service.js';
import { storeAnalysis } from '../analyses/store-analysis.js';
import { DatabaseService } from '../database/database.service.js';
import { EngineService } from '../engine/engine.service.js';
import type { Checked } from '../engine/tasks.js';
import { faulty, notFound, Problem } from '../faults/problem.js';
import { hashOf } from './hash.js';
import { REVISION_COLUMNS, revisionView, type RevisionRow } from './revision-view.js';
import type { LatestRevision, RevisionView, Summary } from './schemas.js';

export type Author = { readonly id: string; readonly name: string };

@Injectable()
export class RevisionsService {
  constructor(
    @Inject(DatabaseService) private readonly database: DatabaseService,
    @Inject(AccessService) private readonly access: AccessService,
    @Inject(EngineService) private readonly engine: EngineService,
  ) {}

  async list(userId: string, projectId: string): Promise<RevisionView[]> {
    await this.access.require(userId, projectId, 'read');
    const rows = await this.database.prisma.revision.findMany({
      where: { projectId },
      select: REVISION_COLUMNS,
      orderBy: { number: 'asc' },
    });
    return rows.map(revisionView);
  }

  /** The revision with the highest number of each project that has any. */
  async latest(projectIds: readonly string[]): Promise<ReadonlyMap<string, LatestRevision>> {
    const rows = await this.database.prisma.$queryRaw<(LatestRevision & { readonly projectId: string })[]>`
      SELECT DISTINCT ON ("project_id") "project_id" AS "projectId", "id", "number", "name", "state"::text AS "state"
      FROM "revision" WHERE "project_id" = ANY (${projectIds}::uuid[]) ORDER BY "project_id", "number" DESC`;
    return new Map(rows.map(({ projectId, ...latest }) => [projectId, latest]));
  }

  async one(userId: string, projectId: string, revisionId: string): Promise<RevisionView> {
    await this.access.require(userId, projectId, 'read');
    return revisionView(await this.find(projectId, revisionId));
  }

  /** The building as it was saved; issued or not, its hash is computed again and must be the one that was saved. */
  async building(
    userId: string,
    projectId: string,
    revisionId: string,
  ): Promise<{ building: Building; revision: RevisionView }> {
    await this.access.require(userId, projectId, 'read');
    const revision = await this.find(projectId, revisionId);
    const building = await this.savedBuilding(revisionId);
    if (hashOf(building) !== revision.hash) {
      throw new Problem(
        500,
        'hash-mismatch',
        'The saved building does not have the hash under which it was saved: it was changed outside the service.',
      );
    }
    return { building, revision: revisionView(revision) };
  }

  /** A new draft, from another revision or from a building file. */
  async create(
    author: Author,
    projectId: string,
    name: string,
    from: string | undefined,
    building: unknown,
  ): Promise<RevisionView> {
    await this.access.require(author.id, projectId, 'write');
    if (from !== undefined) await this.find(projectId, from);
    const document = from === undefined ? building : await this.savedBuilding(from);
    const checked = sound(await this.engine.run('check', { document }));
    return this.insert(projectId, { name, createdBy: author.name, basedOn: from ?? null }, checked);
  }

  /** Adds a draft with the next number of its project. */
  async insert(
    projectId: string,
    head: { readonly name: string; readonly createdBy: string; readonly basedOn: string | null },
    { building, analysis }: Checked,
  ): Promise<RevisionView> {
    return this.database.write(async (transaction) => {
      // One numbering at a time in a project.
      await transaction.$queryRaw`SELECT 1 AS "locked" FROM "project" WHERE "id" = ${projectId}::uuid FOR UPDATE`;
      const last = await transaction.revision.aggregate({ where: { projectId }, _max: { number: true } });
      const row = await transaction.revision.create({
        data: {
          projectId,
          ...head,
          number: (last._max.number ?? 0) + 1,
          building,
          hash: hashOf(building),
          summary: summaryOf(building, analysis),
        },
        select: REVISION_COLUMNS,
      });
      await storeAnalysis(transaction, { projectId, revisionId: row.id }, building, analysis);
      await transaction.project.update({ where: { id: projectId }, data: { updatedAt: new Date() } });
      return revisionView(row);
    });
  }

  /** Saves a draft's building with its analysis, or nothing at all. */
  async save(
    author: Author,
    projectId: string,
    revisionId: string,
    text: string,
    version: number,
  ): Promise<RevisionView> {
    await this.access.require(author.id, projectId, 'write');
    const before = await this.find(projectId, revisionId);
    if (before.state === 'issued') throw issued();
    if (before.version !== version) throw await this.stale(projectId, revisionId);
    const { building, analysis } = sound(await this.engine.run('check', { text }));
    const saved = await this.database.write(async (transaction) => {
      const { count } = await transaction.revision.updateMany({
        where: { id: revisionId, version, state: 'draft' },
        data: {
          building,
          hash: hashOf(building),
          summary: summaryOf(building, analysis),
          version: { increment: 1 },
          updatedAt: new Date(),
        },
      });
      if (count === 0) return false;
      await storeAnalysis(transaction, { projectId, revisionId }, building, analysis);
      await transaction.project.update({ where: { id: projectId }, data: { updatedAt: new Date() } });
      return true;
    });
    if (!saved) throw await this.stale(projectId, revisionId);
    return revisionView(await this.find(projectId, revisionId));
  }

  rename(author: Author, projectId: string, revisionId: string, name: string, version: number): Promise<RevisionView> {
    return this.change(author, projectId, revisionId, version, { name });
  }

  /** From now on the revision never changes: the database itself refuses. */
  issue(
    author: Author,
    projectId: string,
    revisionId: string,
    version: number,
    issue: { readonly purpose: string; readonly remarks: string | undefined },
  ): Promise<RevisionView> {
    const remarks = issue.remarks === undefined || issue.remarks === '' ? null : issue.remarks;
    return this.change(author, projectId, revisionId, version, {
      state: 'issued',
      issuedAt: new Date(),
      purpose: issue.purpose,
      remarks,
    });
  }

  async remove(author: Author, projectId: string, revisionId: string, version: number): Promise<void> {
    await this.access.require(author.id, projectId, 'write');
    const before = await this.find(projectId, revisionId);
    if (before.state === 'issued') throw issued();
    if (before.version !== version) throw await this.stale(projectId, revisionId);
    const follower = await this.database.prisma.revision.findFirst({
      where: { basedOn: revisionId, state: 'issued' },
      select: { number: true },
    });
    if (follower !== null) {
      throw new Problem(
        409,
        'followed',
        `The issued revision ${follower.number} was made from this draft, so it stays.`,
      );
    }
    const { count } = await this.database.write((transaction) =>
      transaction.revision.deleteMany({ where: { id: revisionId, version, state: 'draft' } }),
    );
    if (count === 0) throw await this.stale(projectId, revisionId);
  }

  private async change(
    author: Author,
    projectId: string,
    revisionId: string,
    version: number,
    data: { name: string } | { state: 'issued'; issuedAt: Date; purpose: string; remarks: string | null },
  ): Promise<RevisionView> {
    await this.access.require(author.id, projectId, 'write');
    const before = await this.find(projectId, revisionId);
    if (before.state === 'issued') throw issued();
    const { count } = await this.database.write((transaction) =>
      transaction.revision.updateMany({
        where: { id: revisionId, version, state: 'draft' },
        data: { ...data, version: { increment: 1 }, updatedAt: new Date() },
      }),
    );
    if (count === 0) throw await this.stale(projectId, revisionId);
    return revisionView(await this.find(projectId, revisionId));
  }

  private async find(projectId: string, revisionId: string): Promise<RevisionRow> {
    const row = isId(revisionId)
      ? await this.database.prisma.revision.findFirst({
          where: { id: revisionId, projectId },
          select: REVISION_COLUMNS,
        })
      : null;
    if (row === null) throw notFound('revision');
    return row;
  }

  private async savedBuilding(revisionId: string): Promise<Building> {
    const { building } = await this.database.prisma.revision.findUniqueOrThrow({
      where: { id: revisionId },
      select: { building: true },
    });
    return building as unknown as Building;
  }

  /** What is saved now goes with the refusal, so that nothing typed is lost. */
  private async stale(projectId: string, revisionId: string): Promise<Problem> {
    const revision = await this.find(projectId, revisionId);
    const current = { revision: revisionView(revision), building: await this.savedBuilding(revisionId) };
    return new Problem(
      412,
      'stale',
      'Someone else saved this draft in the meantime. Nothing of yours was saved, nothing of theirs was lost.',
      { current },
    );
  }
}

/** A building and its analysis, or the problem with every fault. */
export function sound(checked: Result<Checked>): Checked {
  if (!checked.ok) throw faulty(checked.faults);
  return checked.value;
}

function summaryOf(building: Building, analysis: Analysis): Summary {
  const count = (severity: string): number =>
    analysis.findings.filter((finding) => finding.severity === severity).length;
  return {
    findings: { note: count('note'), warning: count('warning'), openEnd: count('open-end') },
    worstResidual: analysis.certificate.worstResidual,
    levels: building.levels.length,
    wallLines: building.wallLines.length,
  };
}

function issued(): Problem {
  return new Problem(409, 'issued', 'An issued revision never changes. Make a new revision from it.');
}

function isId(text: string): boolean {
  return /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i.test(text);
}
