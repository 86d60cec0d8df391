import { Inject, Injectable } from '@nestjs/common';
import { AccessService } from '../access/access.service.js';
import { fromDatabaseRole, type Role } from '../access/roles.js';
import { LinksService } from '../auth/links.service.js';
import { PeopleService } from '../auth/people.service.js';
import { DatabaseService } from '../database/database.service.js';
import { notFound, Problem } from '../faults/problem.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import type { MemberAnswer, ProjectDetail, ProjectSummary } from './schemas.js';

@Injectable()
export class ProjectsService {
  constructor(
    @Inject(DatabaseService) private readonly database: DatabaseService,
    @Inject(AccessService) private readonly access: AccessService,
    @Inject(LinksService) private readonly links: LinksService,
    @Inject(PeopleService) private readonly people: PeopleService,
    @Inject(RevisionsService) private readonly revisions: RevisionsService,
  ) {}

  async list(userId: string): Promise<ProjectSummary[]> {
    const memberships = await this.database.prisma.membership.findMany({
      where: { userId },
      include: { project: true },
      orderBy: [{ project: { updatedAt: 'desc' } }, { projectId: 'asc' }],
    });
    const latest = await this.revisions.latest(memberships.map(({ projectId }) => projectId));
    return memberships.map(({ project, role }) => ({
      id: project.id,
      name: project.name,
      role: fromDatabaseRole(role),
      updatedAt: project.updatedAt.toISOString(),
      latest: latest.get(project.id) ?? null,
    }));
  }

  async create(userId: string, name: string): Promise<ProjectDetail> {
    const { id } = await this.database.write((transaction) =>
      transaction.project.create({ data: { name, memberships: { create: { userId, role: 'owner' } } } }),
    );
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
    const { count } = await this.database.write((transaction) =>
      transaction.project.updateMany({
        where: { id: projectId, version },
        data: { name, version: { increment: 1 }, updatedAt: new Date() },
      }),
    );
    const current = await this.detail(userId, projectId);
    if (count === 0) throw new Problem(412, 'stale', 'Someone else changed the project in the meantime.', { current });
    return current;
  }

  async addMember(userId: string, projectId: string, email: string, role: Role): Promise<MemberAnswer> {
    await this.access.require(userId, projectId, 'manage');
    const person = await this.people.byEmail(email);
    if (person === null) return { member: null, invitation: await this.links.invitation(projectId, email, role) };
    await this.access.grant(projectId, person.id, role);
    return { member: { userId: person.id, name: person.name, email: person.email, role }, invitation: null };
  }

  async removeMember(userId: string, projectId: string, memberId: string): Promise<void> {
    await this.access.require(userId, projectId, 'manage');
    await this.access.revoke(projectId, memberId);
  }
}
