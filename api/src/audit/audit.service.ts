import { Inject, Injectable } from '@nestjs/common';
import { AccessService } from '../access/access.service.js';
import { DatabaseService } from '../database/database.service.js';
import type { AuditPage } from './schemas.js';
import { sentenceOf } from './sentence.js';

@Injectable()
export class AuditService {
  constructor(
    @Inject(DatabaseService) private readonly database: DatabaseService,
    @Inject(AccessService) private readonly access: AccessService,
  ) {}

  /** What was written in a project, the latest first. */
  async page(userId: string, projectId: string, before: bigint | undefined, limit: number): Promise<AuditPage> {
    await this.access.require(userId, projectId, 'audit');
    const rows = await this.database.prisma.audit.findMany({
      where: { projectId, ...(before === undefined ? {} : { id: { lt: before } }) },
      orderBy: { id: 'desc' },
      take: limit + 1,
    });
    const page = rows.slice(0, limit);
    const names = await this.namesOf(page.flatMap(({ before: earlier, after }) => [userOf(earlier), userOf(after)]));
    return {
      entries: page.map(({ id, at, actorName, subject, operation, before: earlier, after }) => ({
        id: String(id),
        at: at.toISOString(),
        by: actorName,
        what: sentenceOf(subject, operation, recordOf(earlier), recordOf(after), names),
      })),
      next: rows.length > limit ? String(page[page.length - 1]?.id ?? '') : null,
    };
  }

  private async namesOf(ids: readonly (string | undefined)[]): Promise<ReadonlyMap<string, string>> {
    const users = await this.database.prisma.user.findMany({
      where: { id: { in: [...new Set(ids.filter((id) => id !== undefined))] } },
      select: { id: true, name: true },
    });
    return new Map(users.map(({ id, name }) => [id, name]));
  }
}

function recordOf(value: unknown): Readonly<Record<string, unknown>> {
  return value !== null && typeof value === 'object' ? (value as Record<string, unknown>) : {};
}

function userOf(value: unknown): string | undefined {
  const id = recordOf(value)['user_id'];
  return typeof id === 'string' ? id : undefined;
}
