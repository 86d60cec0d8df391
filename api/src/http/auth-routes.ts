/** Sign-in, sign-out and the session, by better-auth. Its other routes stay closed: accounts come from links alone. */
import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import { fromNodeHeaders } from 'better-auth/node';
import type { FastifyInstance, FastifyReply, FastifyRequest } from 'fastify';
import type { Accounts } from '../auth/accounts.js';
import { ACCOUNTS } from '../auth/tokens.js';

export const AUTH_ROUTES = [
  { method: 'POST', url: '/api/auth/sign-in/email' },
  { method: 'POST', url: '/api/auth/sign-out' },
  { method: 'GET', url: '/api/auth/get-session' },
] as const;

export function mountAuth(fastify: FastifyInstance, app: NestFastifyApplication): void {
  const handle = async (request: FastifyRequest, reply: FastifyReply): Promise<FastifyReply> => {
    const accounts = app.get<Accounts>(ACCOUNTS);
    const headers = fromNodeHeaders(request.headers);
    headers.delete('content-length');
    const response = await accounts.handler(
      new Request(new URL(request.url, `http://${request.headers.host ?? 'localhost'}`), {
        method: request.method,
        headers,
        ...(request.method === 'POST' ? { body: JSON.stringify(request.body ?? {}) } : {}),
      }),
    );
    void reply.status(response.status);
    response.headers.forEach((value, name) => {
      if (name !== 'set-cookie') void reply.header(name, value);
    });
    for (const cookie of response.headers.getSetCookie()) void reply.header('set-cookie', cookie);
    return reply.send(await response.text());
  };
  for (const route of AUTH_ROUTES) fastify.route({ ...route, handler: handle });
}
