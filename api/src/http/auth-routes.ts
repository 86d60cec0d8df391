/** Sign-in, sign-out and the session, by better-auth. Its other routes stay closed: accounts come from links alone. */
import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import { fromNodeHeaders } from 'better-auth/node';
import type { FastifyInstance, FastifyReply, FastifyRequest } from 'fastify';
import { z } from 'zod';
import { ADDRESS_HEADER, type Accounts } from '../auth/accounts.js';
import { ACCOUNTS } from '../auth/tokens.js';
import { sendProblem } from '../faults/problem.filter.js';
import { Problem } from '../faults/problem.js';

export const AUTH_ROUTES = [
  { method: 'POST', url: '/api/auth/sign-in/email' },
  { method: 'POST', url: '/api/auth/sign-out' },
  { method: 'GET', url: '/api/auth/get-session' },
] as const;

export function mountAuth(fastify: FastifyInstance, app: NestFastifyApplication): void {
  const handle = async (request: FastifyRequest, reply: FastifyReply): Promise<FastifyReply> => {
    const response = await app.get<Accounts>(ACCOUNTS).handler(asWebRequest(request));
    const text = await response.text();
    for (const cookie of response.headers.getSetCookie()) void reply.header('set-cookie', cookie);
    const retry = response.headers.get('x-retry-after');
    if (retry !== null) void reply.header('retry-after', retry);
    if (response.status >= 500) throw new Error(`Accounts answered ${response.status}: ${text}`);
    if (!response.ok) return sendProblem(reply, request.url, refused(response.status, text));
    return reply.status(response.status).header('content-type', 'application/json').send(text);
  };
  for (const route of AUTH_ROUTES) fastify.route({ ...route, handler: handle });
}

function asWebRequest(request: FastifyRequest): Request {
  const headers = fromNodeHeaders(request.headers);
  headers.delete('content-length');
  // By which sign-in tries are counted: never what the caller says of itself.
  headers.set(ADDRESS_HEADER, request.ip);
  return new Request(new URL(request.url, `http://${request.headers.host ?? 'localhost'}`), {
    method: request.method,
    headers,
    ...(request.method === 'POST' ? { body: JSON.stringify(request.body ?? {}) } : {}),
  });
}

const Refusal = z.object({ code: z.string().optional(), message: z.string().optional() });

function refused(status: number, text: string): Problem {
  const { code, message } = Refusal.safeParse(parsed(text)).data ?? {};
  if (status === 429) return new Problem(429, 'too-many-tries', message ?? 'Too many tries; wait a minute.');
  return new Problem(
    status,
    (code ?? 'refused').toLowerCase().replaceAll('_', '-'),
    message ?? 'The request was refused.',
  );
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}
