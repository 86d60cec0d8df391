import {
  Body,
  Controller,
  Delete,
  Get,
  Headers,
  HttpCode,
  Inject,
  Param,
  Patch,
  Post,
  Put,
  Query,
  Res,
} from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import type { FastifyReply } from 'fastify';
import { z } from 'zod';
import { User, type SignedIn } from '../auth/session.guard.js';
import { Answers, Asks, NamesVersion, Takes } from '../openapi/decorators.js';
import { etagOf, versionIn } from '../openapi/etag.js';
import { RevisionsService } from './revisions.service.js';
import { Building, IssueRequest, NewRevision, RevisionChange, RevisionView } from './schemas.js';

const BuildingQuery = z.object({ download: z.literal('1').optional() });

@ApiTags('revisions')
@Controller('api/projects/:projectId/revisions')
export class RevisionsController {
  constructor(@Inject(RevisionsService) private readonly revisions: RevisionsService) {}

  @Get()
  @Answers(200, z.array(RevisionView), [401, 404])
  list(@User() user: SignedIn, @Param('projectId') projectId: string): Promise<RevisionView[]> {
    return this.revisions.list(user.id, projectId);
  }

  @Post()
  @Takes(NewRevision)
  @Answers(201, RevisionView, [400, 401, 403, 404, 413, 422])
  async create(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Body({ schema: NewRevision }) body: z.infer<typeof NewRevision>,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<RevisionView> {
    return tagged(reply, await this.revisions.create(user, projectId, body.name, body.from, body.building));
  }

  @Get(':revisionId')
  @Answers(200, RevisionView, [401, 404])
  async one(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Param('revisionId') revisionId: string,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<RevisionView> {
    return tagged(reply, await this.revisions.one(user.id, projectId, revisionId));
  }

  @Patch(':revisionId')
  @NamesVersion()
  @Takes(RevisionChange)
  @Answers(200, RevisionView, [400, 401, 403, 404, 409, 412, 428])
  async rename(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Param('revisionId') revisionId: string,
    @Headers('if-match') ifMatch: string | undefined,
    @Body({ schema: RevisionChange }) body: z.infer<typeof RevisionChange>,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<RevisionView> {
    return tagged(reply, await this.revisions.rename(user, projectId, revisionId, body.name, versionIn(ifMatch)));
  }

  @Delete(':revisionId')
  @HttpCode(204)
  @NamesVersion()
  @Answers(204, undefined, [401, 403, 404, 409, 412, 428])
  remove(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Param('revisionId') revisionId: string,
    @Headers('if-match') ifMatch: string | undefined,
  ): Promise<void> {
    return this.revisions.remove(user, projectId, revisionId, versionIn(ifMatch));
  }

  @Get(':revisionId/building')
  @Asks(BuildingQuery)
  @Answers(200, Building, [401, 404])
  async building(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Param('revisionId') revisionId: string,
    @Query({ schema: BuildingQuery }) query: z.infer<typeof BuildingQuery>,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<Building> {
    const { building, revision } = await this.revisions.building(user.id, projectId, revisionId);
    tagged(reply, revision);
    if (query.download === '1') {
      const name = `${building.name} ${revision.number}`.replaceAll(/[^\p{L}\p{N} ._-]/gu, '').trim() || 'building';
      void reply.header('content-disposition', `attachment; filename*=UTF-8''${encodeURIComponent(name)}.json`);
    }
    return building;
  }

  /** The body is read by the engine's own reader: it is not parsed before, so that its faults are the reader's. */
  @Put(':revisionId/building')
  @NamesVersion()
  @Takes(Building)
  @Answers(200, RevisionView, [401, 403, 404, 409, 412, 413, 422, 428])
  async save(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Param('revisionId') revisionId: string,
    @Headers('if-match') ifMatch: string | undefined,
    @Body() body: unknown,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<RevisionView> {
    const text = typeof body === 'string' ? body : '';
    return tagged(reply, await this.revisions.save(user, projectId, revisionId, text, versionIn(ifMatch)));
  }

  @Post(':revisionId/issue')
  @HttpCode(200)
  @NamesVersion()
  @Takes(IssueRequest)
  @Answers(200, RevisionView, [400, 401, 403, 404, 409, 412, 428])
  async issue(
    @User() user: SignedIn,
    @Param('projectId') projectId: string,
    @Param('revisionId') revisionId: string,
    @Headers('if-match') ifMatch: string | undefined,
    @Body({ schema: IssueRequest }) body: z.infer<typeof IssueRequest>,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<RevisionView> {
    const issue = { purpose: body.purpose, remarks: body.remarks };
    return tagged(reply, await this.revisions.issue(user, projectId, revisionId, versionIn(ifMatch), issue));
  }
}

function tagged(reply: FastifyReply, revision: RevisionView): RevisionView {
  void reply.header('etag', etagOf(revision.version));
  return revision;
}
