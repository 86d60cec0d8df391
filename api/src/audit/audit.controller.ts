import { Controller, Get, Inject, Param, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import type { z } from 'zod';
import { User, type SignedIn } from '../auth/session.guard.js';
import { Answers, Asks } from '../openapi/decorators.js';
import { AuditService } from './audit.service.js';
import { AuditPage, AuditQuery } from './schemas.js';

@ApiTags('projects')
@Controller('api/projects/:projectId')
export class AuditController {
  constructor(@Inject(AuditService) private readonly audit: AuditService) {}

  @Get('audit')
  @Asks(AuditQuery)
  @Answers(200, AuditPage, [400, 401, 403, 404])
  page(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Query({ schema: AuditQuery }) { before, limit = 100 }: z.infer<typeof AuditQuery>,
  ): Promise<AuditPage> {
    return this.audit.page(user.id, projectId, before === undefined ? undefined : BigInt(before), limit);
  }
}
