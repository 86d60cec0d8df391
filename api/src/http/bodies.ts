/** Bodies: JSON is parsed here, but a building file goes through as text, for the engine's reader to read. */
import type { FastifyInstance } from 'fastify';
import { Problem } from '../faults/problem.js';

export const LARGEST_BODY = 20_000_000;

export function readBodies(fastify: FastifyInstance): void {
  fastify.removeAllContentTypeParsers();
  fastify.addContentTypeParser(
    ['application/json', 'text/plain'],
    { parseAs: 'string', bodyLimit: LARGEST_BODY },
    (request, body, done) => {
      if (request.method === 'PUT' && /\/building(\?|$)/.test(request.url)) {
        done(null, body);
        return;
      }
      if (body === '') {
        done(null, undefined);
        return;
      }
      try {
        done(null, JSON.parse(body as string));
      } catch {
        done(new Problem(400, 'not-json', 'The body is not JSON.'), undefined);
      }
    },
  );
}
