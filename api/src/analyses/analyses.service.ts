import { Inject, Injectable } from '@nestjs/common';
import { faultSentence } from '@groundward/engine/building/fault';
import type { Wanted } from '@groundward/engine/working/explain';
import type { Working } from '@groundward/engine/working/result';
import { trace } from '@groundward/engine/path/trace';
import type { Analysis } from '@groundward/engine/path/result';
import type { Trace } from '@groundward/engine/path/trace-result';
import { DatabaseService } from '../database/database.service.js';
import { EngineService } from '../engine/engine.service.js';
import { notFound, Problem } from '../faults/problem.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { demandOf, readDemands, type DemandRow } from './demand-rows.js';
import type { DemandQuery, DemandPage } from './schemas.js';

/** What names one row of a demand table. */
type OneDemand = {
  readonly member: string;
  readonly quantity: string;
  readonly case: string;
  readonly sense: '1' | '-1';
  readonly combination?: string | undefined;
};

@Injectable()
export class AnalysesService {
  constructor(
    @Inject(DatabaseService) private readonly database: DatabaseService,
    @Inject(RevisionsService) private readonly revisions: RevisionsService,
    @Inject(EngineService) private readonly engine: EngineService,
  ) {}

  /** The analysis as it was stored when its building was saved. */
  async analysis(userId: string, projectId: string, revisionId: string): Promise<Analysis> {
    await this.revisions.one(userId, projectId, revisionId);
    const [stored, demands] = await Promise.all([
      this.database.prisma.analysis.findUnique({ where: { revisionId } }),
      readDemands(this.database.pool, revisionId),
    ]);
    if (stored === null) throw notFound('analysis');
    const document = stored.document as unknown as Omit<Analysis, 'demands'>;
    return { schema: document.schema, units: document.units, demands, ...rest(document) };
  }

  /** Demand rows by any of their columns, page by page. */
  async demands(userId: string, projectId: string, revisionId: string, query: DemandQuery): Promise<DemandPage> {
    await this.revisions.one(userId, projectId, revisionId);
    const limit = query.limit ?? 1000;
    const rows = await this.database.prisma.demand.findMany({
      where: {
        revisionId,
        position: { gt: query.after ?? -1 },
        ...(query.member === undefined ? {} : { member: query.member }),
        ...(query.kind === undefined ? {} : { kind: query.kind }),
        ...(query.quantity === undefined ? {} : { quantity: query.quantity }),
        ...(query.level === undefined ? {} : { level: query.level }),
        ...(query.case === undefined ? {} : { case: query.case }),
        ...(query.sense === undefined ? {} : { sense: Number(query.sense) }),
        ...(query.combination === undefined
          ? {}
          : { combination: query.combination === '' ? null : query.combination }),
      },
      orderBy: { position: 'asc' },
      take: limit + 1,
    });
    const page = rows.slice(0, limit);
    return {
      demands: page.map(demandOf),
      next: rows.length > limit ? (page[page.length - 1]?.position ?? null) : null,
    };
  }

  /** One demand in every revision of a project that has it: one index scan. The caller has checked who asks. */
  acrossRevisions(projectId: string, demand: OneDemand): Promise<Pick<DemandRow, 'revisionId' | 'value' | 'unit'>[]> {
    return this.database.prisma.demand.findMany({
      where: {
        projectId,
        member: demand.member,
        quantity: demand.quantity,
        case: demand.case,
        sense: Number(demand.sense),
        combination: demand.combination ?? null,
      },
      select: { revisionId: true, value: true, unit: true },
    });
  }

  /** Up and down from a member, computed on request. */
  async trace(userId: string, projectId: string, revisionId: string, member: string, caseId: string): Promise<Trace> {
    const { building } = await this.revisions.building(userId, projectId, revisionId);
    const result = trace(building, member, caseId);
    if (result.ok) return result.value;
    const fault = result.faults[0];
    throw new Problem(
      404,
      fault?.code ?? 'not-found',
      `Found ${fault?.found ?? member}, expected ${fault?.expected ?? 'a member'}.`,
    );
  }

  /** The working behind one demand, computed on request. */
  async working(userId: string, projectId: string, revisionId: string, wanted: Wanted): Promise<Working> {
    const { building } = await this.revisions.building(userId, projectId, revisionId);
    const result = await this.engine.run('working', { building, wanted });
    if (result.ok) return result.value;
    const [fault] = result.faults;
    throw new Problem(404, fault?.code ?? 'not-found', fault === undefined ? 'No such demand.' : faultSentence(fault));
  }
}

function rest({ diagrams, path, findings, certificate }: Omit<Analysis, 'demands'>) {
  return { diagrams, path, findings, certificate };
}
