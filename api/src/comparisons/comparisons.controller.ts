import { Controller, Get, Inject, Param, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { compare } from '@groundward/engine/compare/compare';
import type { Comparison } from '@groundward/engine/compare/result';
import { DemandKind, Quantity, Sense } from '@groundward/engine/path/result';
import { z } from 'zod';
import { AnalysesService } from '../analyses/analyses.service.js';
import { User, type SignedIn } from '../auth/session.guard.js';
import { CausesService } from './causes.service.js';
import { Answers, Asks } from '../openapi/decorators.js';
import { RevisionsService } from '../revisions/revisions.service.js';

const CompareQuery = z.object({
  before: z.uuid(),
  after: z.uuid(),
  causes: z.enum(['true', 'false']).optional().describe('Whether to share each change among the edits; default false'),
});

const ComparisonView = z.object({
  schema: z.literal('groundward.comparison/1'),
  edits: z.array(z.object({ id: z.string(), what: z.string(), patch: z.array(z.record(z.string(), z.unknown())) })),
  matches: z
    .array(z.object({ kind: z.string(), before: z.string(), after: z.string() }))
    .optional()
    .describe('Members whose ids changed and that were known again by their place'),
  method: z
    .discriminatedUnion('kind', [
      z.object({ kind: z.literal('exact') }),
      z.object({ kind: z.literal('sampled'), pairs: z.number(), seed: z.number() }),
    ])
    .optional()
    .describe('How the causes were found'),
  changes: z.array(
    z.object({
      member: z.string(),
      kind: DemandKind,
      quantity: Quantity,
      case: z.string(),
      sense: Sense,
      combination: z.string().optional(),
      before: z.number().nullable(),
      after: z.number().nullable(),
      unit: z.string(),
      class: z.enum(['added', 'removed', 'moved', 'raised', 'lowered', 'unchanged']),
      causes: z.array(
        z.object({
          edit: z.string(),
          share: z.number().describe('In the demand’s own unit; shares add up to after − before'),
          error: z.number().optional().describe('Standard error of a share that was sampled'),
        }),
      ),
    }),
  ),
});

@ApiTags('revisions')
@Controller('api/projects/:projectId')
export class ComparisonsController {
  constructor(
    @Inject(RevisionsService) private readonly revisions: RevisionsService,
    @Inject(AnalysesService) private readonly analyses: AnalysesService,
    @Inject(CausesService) private readonly causes: CausesService,
  ) {}

  @Get('compare')
  @Asks(CompareQuery)
  @Answers(200, ComparisonView, [400, 401, 404, 503])
  async compare(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Query({ schema: CompareQuery }) query: z.infer<typeof CompareQuery>,
  ): Promise<Comparison> {
    const before = await this.revision(user.id, projectId, query.before);
    const after = await this.revision(user.id, projectId, query.after);
    if (query.causes !== 'true') return compare(before, after);
    return this.causes.between(`${before.hash} ${after.hash}`, before, after);
  }

  private async revision(userId: string, projectId: string, revisionId: string) {
    const [{ building, revision }, analysis] = await Promise.all([
      this.revisions.building(userId, projectId, revisionId),
      this.analyses.analysis(userId, projectId, revisionId),
    ]);
    return { building, analysis, hash: revision.hash };
  }
}
