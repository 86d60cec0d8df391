import { Controller, Get, Inject } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { z } from 'zod';
import { Public } from '../auth/session.guard.js';
import { DatabaseService } from '../database/database.service.js';
import { databaseDown } from '../faults/problem.js';
import { Answers } from '../openapi/decorators.js';

export const VERSION = '0.1.0';

const Health = z.object({ status: z.literal('ok'), database: z.literal('ok'), version: z.string() });

@ApiTags('operation')
@Controller('api/health')
export class HealthController {
  constructor(@Inject(DatabaseService) private readonly database: DatabaseService) {}

  @Public()
  @Get()
  @Answers(200, Health, [503])
  async health(): Promise<z.infer<typeof Health>> {
    if (!(await this.database.answers())) throw databaseDown();
    return { status: 'ok', database: 'ok', version: VERSION };
  }
}
