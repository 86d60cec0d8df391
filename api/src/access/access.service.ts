/** Who may do what in a project. Another project's people are told that it does not exist. */
import { Inject, Injectable } from '@nestjs/common';
import { z } from 'zod';
import { DatabaseService } from '../database/database.service.js';
import { notFound, Problem } from '../faults/problem.js';
import { fromDatabaseRole, mayDo, type Right, type Role } from './roles.js';

@Injectable()
export class AccessService {
  constructor(@Inject(DatabaseService) private readonly database: DatabaseService) {}

  /** @returns the caller's role, when it has the right */
  async require(userId: string, projectId: string, right: Right): Promise<Role> {
    if (!z.uuid().safeParse(projectId).success) throw notFound('project');
    const membership = await this.database.prisma.membership.findUnique({
      where: { projectId_userId: { projectId, userId } },
    });
    if (membership === null) throw notFound('project');
    const role = fromDatabaseRole(membership.role);
    if (!mayDo(role, right)) throw new Problem(403, 'not-allowed', `As ${role} of this project you may not do that.`);
    return role;
  }
}
