import { Controller, Get, Inject, Param, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Analysis } from '@groundward/engine/path/result';
import { Working } from '@groundward/engine/working/result';
import type { Trace } from '@groundward/engine/path/trace-result';
import type { z } from 'zod';
import { User, type SignedIn } from '../auth/session.guard.js';
import { Answers, Asks } from '../openapi/decorators.js';
import { AnalysesService } from './analyses.service.js';
import { DemandPage, DemandQuery, TraceQuery, TraceView, WorkingQuery } from './schemas.js';

@ApiTags('analyses')
@Controller('api/projects/:projectId/revisions/:revisionId')
export class AnalysesController {
  constructor(@Inject(AnalysesService) private readonly analyses: AnalysesService) {}

  @Get('analysis')
  @Answers(200, Analysis, [401, 404])
  analysis(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Param('revisionId') revisionId: string,
  ): Promise<Analysis> {
    return this.analyses.analysis(user.id, projectId, revisionId);
  }

  @Get('demands')
  @Asks(DemandQuery)
  @Answers(200, DemandPage, [400, 401, 404])
  demands(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Param('revisionId') revisionId: string,
    @Query({ schema: DemandQuery }) query: z.infer<typeof DemandQuery>,
  ): Promise<DemandPage> {
    return this.analyses.demands(user.id, projectId, revisionId, query);
  }

  @Get('trace')
  @Asks(TraceQuery)
  @Answers(200, TraceView, [400, 401, 404])
  trace(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Param('revisionId') revisionId: string,
    @Query({ schema: TraceQuery }) query: z.infer<typeof TraceQuery>,
  ): Promise<Trace> {
    return this.analyses.trace(user.id, projectId, revisionId, query.member, query.case);
  }

  @Get('working')
  @Asks(WorkingQuery)
  @Answers(200, Working, [400, 401, 404, 503])
  working(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Param('revisionId') revisionId: string,
    @Query({ schema: WorkingQuery }) query: z.infer<typeof WorkingQuery>,
  ): Promise<Working> {
    const { sense, ...wanted } = query;
    return this.analyses.working(user.id, projectId, revisionId, {
      ...wanted,
      sense: sense === undefined ? undefined : Number(sense),
    });
  }
}
