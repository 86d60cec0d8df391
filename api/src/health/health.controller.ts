import { Controller, Get, Inject } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { z } from 'zod';
import { Public } from '../auth/session.guard.js';
import { DatabaseService } from '../database/database.service.js';
import { Problem } from '../faults/problem.js';
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
    try {
      await this.database.pool.query('SELECT 1 FROM "project" LIMIT 1');
    } catch {
      throw new Problem(503, 'database-down', 'The database does not answer.');
    }
    return { status: 'ok', database: 'ok', version: VERSION };
  }
}
