/** The dashboard: whatever is not under `/api` goes to Next. */
import { createRequire } from 'node:module';
import type * as Next from 'next';
import type { FastifyInstance, FastifyReply, FastifyRequest } from 'fastify';

// Next is a CommonJS module whose types speak of a default export that it has only there.
const next = createRequire(import.meta.url)('next') as typeof Next.default.default;

/** @returns closes it */
export async function mountDashboard(fastify: FastifyInstance, dir: string): Promise<() => Promise<void>> {
  const dashboard = next({ dev: false, dir, quiet: true });
  await dashboard.prepare();
  const handle = dashboard.getRequestHandler();
  const pass = async (request: FastifyRequest, reply: FastifyReply): Promise<void> => {
    // Headers that hooks have set so far would be lost with the hijacked reply.
    for (const [name, value] of Object.entries(reply.getHeaders()))
      if (value !== undefined) reply.raw.setHeader(name, value);
    reply.hijack();
    await handle(request.raw, reply.raw);
  };
  fastify.get('/', pass);
  fastify.get('/*', async (request, reply) => {
    if (request.url === '/api' || request.url.startsWith('/api/')) {
      reply.callNotFound();
      return;
    }
    return pass(request, reply);
  });
  return () => dashboard.close();
}
