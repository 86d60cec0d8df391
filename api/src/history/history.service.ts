import { Inject, Injectable } from '@nestjs/common';
import { DatabaseService } from '../database/database.service.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import type { HistoryQuery, HistoryView } from './history.controller.js';

@Injectable()
export class HistoryService {
  constructor(
    @Inject(DatabaseService) private readonly database: DatabaseService,
    @Inject(RevisionsService) private readonly revisions: RevisionsService,
  ) {}

  /** One demand across all revisions of a project: one index scan. */
  async of(userId: string, projectId: string, query: HistoryQuery): Promise<HistoryView> {
    const revisions = await this.revisions.list(userId, projectId);
    const rows = await this.database.prisma.demand.findMany({
      where: {
        projectId,
        member: query.member,
        quantity: query.quantity,
        case: query.case,
        sense: Number(query.sense),
        combination: query.combination ?? null,
      },
      select: { revisionId: true, value: true, unit: true },
    });
    const byRevision = new Map(rows.map((row) => [row.revisionId, row]));
    return {
      ...query,
      unit: rows[0]?.unit ?? null,
      points: revisions.map(({ id, number, name, state }) => ({
        revisionId: id,
        number,
        name,
        state,
        value: byRevision.get(id)?.value ?? null,
      })),
    };
  }
}
