import { Controller, Get, Inject, Param, Res } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Point, Units } from '@groundward/engine/building/definition';
import { foundationCsv } from '@groundward/engine/foundation/csv';
import { foundation } from '@groundward/engine/foundation/foundation';
import type { Foundation } from '@groundward/engine/foundation/result';
import { Sense } from '@groundward/engine/path/result';
import type { FastifyReply } from 'fastify';
import { z } from 'zod';
import { AnalysesService } from '../analyses/analyses.service.js';
import { User, type SignedIn } from '../auth/session.guard.js';
import { Answers } from '../openapi/decorators.js';
import { RevisionsService } from '../revisions/revisions.service.js';

const FoundationView = z.object({
  schema: z.literal('groundward.foundation/1'),
  units: Units,
  building: z.string(),
  supports: z.array(
    z.object({
      member: z.string(),
      label: z.string(),
      line: z.string(),
      at: Point,
      demands: z.array(
        z.object({
          quantity: z.enum(['shear', 'uplift', 'bearing', 'moment']),
          case: z.string(),
          sense: Sense,
          combination: z.string().optional(),
          value: z.number(),
          unit: z.string(),
          governing: z.boolean(),
        }),
      ),
    }),
  ),
  totals: z.array(
    z.object({
      case: z.string(),
      sense: Sense,
      fx: z.number(),
      fy: z.number(),
      fz: z.number(),
      mx: z.number(),
      my: z.number(),
      mz: z.number(),
    }),
  ),
});

@ApiTags('foundation')
@Controller('api/projects/:projectId/revisions/:revisionId')
export class FoundationController {
  constructor(
    @Inject(RevisionsService) private readonly revisions: RevisionsService,
    @Inject(AnalysesService) private readonly analyses: AnalysesService,
  ) {}

  @Get('foundation')
  @Answers(200, FoundationView, [401, 404])
  async demands(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Param('revisionId') revisionId: string,
  ): Promise<Foundation> {
    const { building } = await this.revisions.building(user.id, projectId, revisionId);
    return foundation(building, await this.analyses.analysis(user.id, projectId, revisionId));
  }

  @Get('foundation.csv')
  @Answers(200, 'text/csv', [401, 404])
  async csv(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Param('revisionId') revisionId: string,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<string> {
    void reply.header('content-type', 'text/csv; charset=utf-8');
    void reply.header('content-disposition', 'attachment; filename="foundation.csv"');
    return foundationCsv(await this.demands(user, projectId, revisionId));
  }
}
