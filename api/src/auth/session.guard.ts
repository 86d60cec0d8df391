/** Lets in who is signed in; routes marked public are open to all. */
import {
  Inject,
  Injectable,
  SetMetadata,
  createParamDecorator,
  type CanActivate,
  type ExecutionContext,
} from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { fromNodeHeaders } from 'better-auth/node';
import type { FastifyRequest } from 'fastify';
import { setActor } from '../database/actor.js';
import { Problem } from '../faults/problem.js';
import { ACCOUNTS } from './tokens.js';
import type { Accounts } from './accounts.js';

export type SignedIn = { readonly id: string; readonly name: string; readonly email: string };

type RequestWithUser = FastifyRequest & { user?: SignedIn };

const PUBLIC = 'groundward:public';

export const Public = (): MethodDecorator & ClassDecorator => SetMetadata(PUBLIC, true);

export const User = createParamDecorator((_: unknown, context: ExecutionContext): SignedIn => {
  const { user } = context.switchToHttp().getRequest<RequestWithUser>();
  if (user === undefined) throw new Problem(401, 'not-signed-in', 'Sign in first.');
  return user;
});

@Injectable()
export class SessionGuard implements CanActivate {
  constructor(
    @Inject(ACCOUNTS) private readonly accounts: Accounts,
    @Inject(Reflector) private readonly reflector: Reflector,
  ) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    if (
      this.reflector.getAllAndOverride<boolean | undefined>(PUBLIC, [context.getHandler(), context.getClass()]) === true
    )
      return true;
    const request = context.switchToHttp().getRequest<RequestWithUser>();
    const session = await this.accounts.api.getSession({ headers: fromNodeHeaders(request.headers) });
    if (session === null) throw new Problem(401, 'not-signed-in', 'Sign in first.');
    request.user = { id: session.user.id, name: session.user.name, email: session.user.email };
    setActor(request.user);
    return true;
  }
}
