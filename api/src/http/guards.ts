/** What holds for every request: security headers, and no write from another site. */
import helmet from '@fastify/helmet';
import type { FastifyInstance } from 'fastify';
import { asRequest } from '../database/actor.js';
import { sendProblem } from '../faults/problem.filter.js';
import { Problem } from '../faults/problem.js';

const READING = new Set(['GET', 'HEAD', 'OPTIONS']);

export async function guardRequests(fastify: FastifyInstance): Promise<void> {
  await fastify.register(helmet, {
    contentSecurityPolicy: {
      directives: {
        defaultSrc: ["'self'"],
        // The dashboard's pages carry their start-up script inline; nothing comes from elsewhere.
        scriptSrc: ["'self'", "'unsafe-inline'"],
        styleSrc: ["'self'", "'unsafe-inline'"],
        fontSrc: ["'self'", 'data:'],
        imgSrc: ["'self'", 'data:', 'blob:'],
        connectSrc: ["'self'"],
        objectSrc: ["'none'"],
        frameAncestors: ["'none'"],
        upgradeInsecureRequests: null,
      },
    },
    strictTransportSecurity: false,
  });
  fastify.addHook('onRequest', (_request, _reply, done) => asRequest(done));
  fastify.addHook('onRequest', async (request, reply) => {
    if (request.url.startsWith('/api')) void reply.header('cache-control', 'no-store');
    const { origin, host } = request.headers;
    if (READING.has(request.method) || origin === undefined) return;
    if (hostOf(origin) === host) return;
    await sendProblem(
      reply,
      request.url,
      new Problem(403, 'other-site', 'A write must come from the dashboard’s own address.'),
    );
  });
}

function hostOf(origin: string): string | undefined {
  return URL.canParse(origin) ? new URL(origin).host : undefined;
}
