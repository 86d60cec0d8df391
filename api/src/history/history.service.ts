import { Inject, Injectable } from '@nestjs/common';
import { AnalysesService } from '../analyses/analyses.service.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import type { HistoryQuery, HistoryView } from './history.controller.js';

@Injectable()
export class HistoryService {
  constructor(
    @Inject(RevisionsService) private readonly revisions: RevisionsService,
    @Inject(AnalysesService) private readonly analyses: AnalysesService,
  ) {}

  /** One demand across all revisions of a project. */
  async of(userId: string, projectId: string, query: HistoryQuery): Promise<HistoryView> {
    const revisions = await this.revisions.list(userId, projectId);
    const rows = await this.analyses.acrossRevisions(projectId, query);
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
