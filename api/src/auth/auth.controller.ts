import { Body, Controller, Get, HttpCode, Inject, Post, Res } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import type { FastifyReply } from 'fastify';
import { z } from 'zod';
import { line } from '../http/text.js';
import { Answers, Takes } from '../openapi/decorators.js';
import { LinksService } from './links.service.js';
import { Public, User, type SignedIn } from './session.guard.js';

const Password = z.string().min(10).max(200);
const OwnerRequest = z.strictObject({
  token: z.string().max(200),
  name: line(200).trim().min(1),
  email: z.email().max(200),
  password: Password,
});
const InvitationRequest = z.strictObject({
  token: z.string().max(200),
  name: line(200).trim().min(1),
  password: Password,
});
const Me = z.object({ id: z.string(), name: z.string(), email: z.string() });
const Done = z.object({ ok: z.literal(true) });

@ApiTags('people')
@Controller('api')
export class AuthController {
  constructor(@Inject(LinksService) private readonly links: LinksService) {}

  @Get('me')
  @Answers(200, Me, [401])
  me(@User() user: SignedIn): SignedIn {
    return user;
  }

  @Public()
  @Post('owner')
  @HttpCode(200)
  @Takes(OwnerRequest)
  @Answers(200, Done, [400, 410, 422])
  async owner(
    @Body({ schema: OwnerRequest }) body: z.infer<typeof OwnerRequest>,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<z.infer<typeof Done>> {
    setCookies(reply, await this.links.becomeOwner(body.token, body));
    return { ok: true };
  }

  @Public()
  @Post('invitations')
  @HttpCode(200)
  @Takes(InvitationRequest)
  @Answers(200, Done, [400, 410, 422])
  async invitation(
    @Body({ schema: InvitationRequest }) body: z.infer<typeof InvitationRequest>,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<z.infer<typeof Done>> {
    setCookies(reply, await this.links.acceptInvitation(body.token, body.name, body.password));
    return { ok: true };
  }
}

function setCookies(reply: FastifyReply, headers: Headers): void {
  for (const cookie of headers.getSetCookie()) void reply.header('set-cookie', cookie);
}
