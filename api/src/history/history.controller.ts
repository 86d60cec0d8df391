import { Controller, Get, Inject, Param, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { Quantity } from '@groundward/engine/path/result';
import { z } from 'zod';
import { User, type SignedIn } from '../auth/session.guard.js';
import { Answers, Asks } from '../openapi/decorators.js';
import { line } from '../http/text.js';
import { RevisionState } from '../revisions/schemas.js';
import { HistoryService } from './history.service.js';

const HistoryQuery = z.object({
  member: line(300).min(1),
  quantity: Quantity,
  case: line(64).min(1),
  sense: z.enum(['1', '-1']),
  combination: line(64).optional(),
});
export type HistoryQuery = z.infer<typeof HistoryQuery>;

const HistoryView = z.object({
  member: z.string(),
  quantity: Quantity,
  case: z.string(),
  sense: z.enum(['1', '-1']),
  combination: z.string().optional(),
  unit: z.string().nullable(),
  points: z.array(
    z.object({
      revisionId: z.uuid(),
      number: z.number().int(),
      name: z.string(),
      state: RevisionState,
      value: z.number().nullable(),
    }),
  ),
});
export type HistoryView = z.infer<typeof HistoryView>;

@ApiTags('revisions')
@Controller('api/projects/:projectId')
export class HistoryController {
  constructor(@Inject(HistoryService) private readonly history: HistoryService) {}

  @Get('history')
  @Asks(HistoryQuery)
  @Answers(200, HistoryView, [400, 401, 404])
  of(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Query({ schema: HistoryQuery }) query: HistoryQuery,
  ): Promise<HistoryView> {
    return this.history.of(user.id, projectId, query);
  }
}
