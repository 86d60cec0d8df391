import { Body, Controller, Delete, Get, Headers, HttpCode, Inject, Param, Patch, Post, Res } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import type { FastifyReply } from 'fastify';
import { z } from 'zod';
import { User, type SignedIn } from '../auth/session.guard.js';
import { Answers, NamesVersion, Takes } from '../openapi/decorators.js';
import { etagOf, versionIn } from '../openapi/etag.js';
import { ProjectsService } from './projects.service.js';
import { MemberAnswer, MemberRequest, ProjectDetail, ProjectRequest, ProjectSummary } from './schemas.js';

@ApiTags('projects')
@Controller('api/projects')
export class ProjectsController {
  constructor(@Inject(ProjectsService) private readonly projects: ProjectsService) {}

  @Get()
  @Answers(200, z.array(ProjectSummary), [401])
  list(@User() user: SignedIn): Promise<ProjectSummary[]> {
    return this.projects.list(user.id);
  }

  @Post()
  @Takes(ProjectRequest)
  @Answers(201, ProjectDetail, [400, 401])
  async create(
    @User() user: SignedIn,
    @Body({ schema: ProjectRequest }) body: z.infer<typeof ProjectRequest>,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<ProjectDetail> {
    const project = await this.projects.create(user.id, body.name);
    void reply.header('etag', etagOf(project.version));
    return project;
  }

  @Get(':projectId')
  @Answers(200, ProjectDetail, [401, 404])
  async detail(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<ProjectDetail> {
    const project = await this.projects.detail(user.id, projectId);
    void reply.header('etag', etagOf(project.version));
    return project;
  }

  @Patch(':projectId')
  @NamesVersion()
  @Takes(ProjectRequest)
  @Answers(200, ProjectDetail, [400, 401, 403, 404, 412, 428])
  async rename(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Headers('if-match') ifMatch: string | undefined,
    @Body({ schema: ProjectRequest }) body: z.infer<typeof ProjectRequest>,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<ProjectDetail> {
    const project = await this.projects.rename(user.id, projectId, body.name, versionIn(ifMatch));
    void reply.header('etag', etagOf(project.version));
    return project;
  }

  @Post(':projectId/members')
  @HttpCode(200)
  @Takes(MemberRequest)
  @Answers(200, MemberAnswer, [400, 401, 403, 404, 409])
  addMember(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Body({ schema: MemberRequest }) body: z.infer<typeof MemberRequest>,
  ): Promise<MemberAnswer> {
    return this.projects.addMember(user.id, projectId, body.email, body.role);
  }

  @Delete(':projectId/members/:userId')
  @HttpCode(204)
  @Answers(204, undefined, [401, 403, 404, 409])
  removeMember(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Param('userId') userId: string,
  ): Promise<void> {
    return this.projects.removeMember(user.id, projectId, userId);
  }
}
