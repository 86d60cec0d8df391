import { Inject, Injectable } from '@nestjs/common';
import { AccessService } from '../access/access.service.js';
import { fromDatabaseRole, toDatabaseRole, type Role } from '../access/roles.js';
import { LinksService } from '../auth/links.service.js';
import { DatabaseService } from '../database/database.service.js';
import { notFound, Problem } from '../faults/problem.js';
import type { MemberAnswer, ProjectDetail, ProjectSummary } from './schemas.js';

@Injectable()
export class ProjectsService {
  constructor(
    @Inject(DatabaseService) private readonly database: DatabaseService,
    @Inject(AccessService) private readonly access: AccessService,
    @Inject(LinksService) private readonly links: LinksService,
  ) {}

  async list(userId: string): Promise<ProjectSummary[]> {
    const memberships = await this.database.prisma.membership.findMany({
      where: { userId },
      include: {
        project: {
          include: {
            revisions: {
              orderBy: { number: 'desc' },
              take: 1,
              select: { id: true, number: true, name: true, state: true },
            },
          },
        },
      },
      orderBy: { project: { updatedAt: 'desc' } },
    });
    return memberships.map(({ project, role }) => ({
      id: project.id,
      name: project.name,
      role: fromDatabaseRole(role),
      updatedAt: project.updatedAt.toISOString(),
      latest: project.revisions[0] ?? null,
    }));
  }

  async create(userId: string, name: string): Promise<ProjectDetail> {
    const { id } = await this.database.prisma.project.create({
      data: { name, memberships: { create: { userId, role: 'owner' } } },
    });
    return this.detail(userId, id);
  }

  async detail(userId: string, projectId: string): Promise<ProjectDetail> {
    const role = await this.access.require(userId, projectId, 'read');
    const project = await this.database.prisma.project.findUnique({
      where: { id: projectId },
      include: { memberships: { include: { user: true }, orderBy: { user: { name: 'asc' } } } },
    });
    if (project === null) throw notFound('project');
    return {
      id: project.id,
      name: project.name,
      role,
      version: project.version,
      members: project.memberships.map(({ user, role: its }) => ({
        userId: user.id,
        name: user.name,
        email: user.email,
        role: fromDatabaseRole(its),
      })),
    };
  }

  async rename(userId: string, projectId: string, name: string, version: number): Promise<ProjectDetail> {
    await this.access.require(userId, projectId, 'manage');
    const { count } = await this.database.prisma.project.updateMany({
      where: { id: projectId, version },
      data: { name, version: { increment: 1 }, updatedAt: new Date() },
    });
    const current = await this.detail(userId, projectId);
    if (count === 0) throw new Problem(412, 'stale', 'Someone else changed the project in the meantime.', { current });
    return current;
  }

  async addMember(userId: string, projectId: string, email: string, role: Role): Promise<MemberAnswer> {
    await this.access.require(userId, projectId, 'manage');
    const user = await this.database.prisma.user.findUnique({ where: { email: email.toLowerCase() } });
    if (user === null) return { member: null, invitation: await this.links.invitation(projectId, email, role) };
    if (role !== 'owner') await this.keepAnOwner(projectId, user.id);
    await this.database.prisma.membership.upsert({
      where: { projectId_userId: { projectId, userId: user.id } },
      create: { projectId, userId: user.id, role: toDatabaseRole(role) },
      update: { role: toDatabaseRole(role) },
    });
    return { member: { userId: user.id, name: user.name, email: user.email, role }, invitation: null };
  }

  async removeMember(userId: string, projectId: string, memberId: string): Promise<void> {
    await this.access.require(userId, projectId, 'manage');
    await this.keepAnOwner(projectId, memberId);
    const { count } = await this.database.prisma.membership.deleteMany({ where: { projectId, userId: memberId } });
    if (count === 0) throw notFound('member');
  }

  private async keepAnOwner(projectId: string, without: string): Promise<void> {
    const owners = await this.database.prisma.membership.findMany({ where: { projectId, role: 'owner' } });
    if (owners.length === 1 && owners[0]?.userId === without) {
      throw new Problem(409, 'last-owner', 'A project keeps at least one owner.');
    }
  }
}
