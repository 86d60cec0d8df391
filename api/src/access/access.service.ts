/** Who may do what in a project. Another project's people are told that it does not exist. */
import { Inject, Injectable } from '@nestjs/common';
import { z } from 'zod';
import { DatabaseService, type Transaction } from '../database/database.service.js';
import { notFound, Problem } from '../faults/problem.js';
import { fromDatabaseRole, mayDo, toDatabaseRole, type Right, type Role } from './roles.js';

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

  /** Lets somebody in, or changes the role of somebody who is in; the last owner stays one. */
  grant(projectId: string, userId: string, role: Role): Promise<void> {
    return this.change(projectId, async (transaction) => {
      if (role !== 'owner') await keepAnOwner(transaction, projectId, userId);
      const its = toDatabaseRole(role);
      await transaction.membership.upsert({
        where: { projectId_userId: { projectId, userId } },
        create: { projectId, userId, role: its },
        update: { role: its },
      });
    });
  }

  /** Takes somebody out; the last owner stays. */
  revoke(projectId: string, userId: string): Promise<void> {
    return this.change(projectId, async (transaction) => {
      await keepAnOwner(transaction, projectId, userId);
      const { count } = await transaction.membership.deleteMany({ where: { projectId, userId } });
      if (count === 0) throw notFound('member');
    });
  }

  /** Makes the first owner the owner of all that was there before anybody. */
  async grantEverything(userId: string): Promise<void> {
    await this.database.write(
      (transaction) => transaction.$executeRaw`
        INSERT INTO "membership" ("project_id", "user_id", "role") SELECT "id", ${userId}, 'owner' FROM "project"
        ON CONFLICT DO NOTHING`,
    );
  }

  /** A project's members are part of what its version stands for; one change of them at a time. */
  private async change(projectId: string, work: (transaction: Transaction) => Promise<void>): Promise<void> {
    await this.database.write(async (transaction) => {
      await transaction.project.update({ where: { id: projectId }, data: { version: { increment: 1 } } });
      await work(transaction);
    });
  }
}

async function keepAnOwner(transaction: Transaction, projectId: string, without: string): Promise<void> {
  const owners = await transaction.membership.findMany({ where: { projectId, role: 'owner' } });
  if (owners.length === 1 && owners[0]?.userId === without) {
    throw new Problem(409, 'last-owner', 'A project keeps at least one owner.');
  }
}
