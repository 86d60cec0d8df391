/** The service: `/api` by Nest, everything else by the dashboard, on one port of one process. */
import 'reflect-metadata';
import { StandardSchemaValidationPipe } from '@nestjs/common';
import { NestFactory } from '@nestjs/core';
import { FastifyAdapter, type NestFastifyApplication } from '@nestjs/platform-fastify';
import { AppModule } from './app.module.js';
import { LinksService } from './auth/links.service.js';
import { DatabaseService } from './database/database.service.js';
import { ProblemFilter } from './faults/problem.filter.js';
import { Problem } from './faults/problem.js';
import { mountAuth } from './http/auth-routes.js';
import { readBodies } from './http/bodies.js';
import { guardRequests } from './http/guards.js';
import { mountDashboard } from './http/dashboard.js';
import { OPENAPI_URL, openApiDocument } from './openapi/document.js';
import { secretOf } from './secret.js';

export type ServeOptions = {
  readonly port: number;
  readonly host: string;
  readonly databaseUrl: string;
  /** The dashboard's folder, built; without it only `/api` is served. */
  readonly webDir?: string;
  /** Where the key that sessions are signed with is kept; GROUNDWARD_SECRET goes before it. */
  readonly secretFile?: string;
};

export type Serving = {
  readonly url: string;
  /** Makes the visitor the owner; only as long as nobody has an account. */
  readonly ownerLink?: string;
  readonly app: NestFastifyApplication;
  readonly close: () => Promise<void>;
};

export async function serve(options: ServeOptions): Promise<Serving> {
  const secret = await secretOf(options.secretFile);
  const app = await NestFactory.create<NestFastifyApplication>(
    AppModule.with({ databaseUrl: options.databaseUrl, secret, origin: addressOf(options.host, options.port) }),
    new FastifyAdapter({ trustProxy: 'loopback', routerOptions: { maxParamLength: 300 } }),
    { bodyParser: false, logger: ['error', 'warn'], abortOnError: false },
  );
  try {
    return await listen(app, options);
  } catch (error) {
    await app.close();
    throw error;
  }
}

async function listen(app: NestFastifyApplication, options: ServeOptions): Promise<Serving> {
  app.useGlobalFilters(new ProblemFilter(() => app.get(DatabaseService).answers()));
  app.useGlobalPipes(new StandardSchemaValidationPipe({ exceptionFactory: wrongRequest }));
  const fastify = app.getHttpAdapter().getInstance();
  readBodies(fastify);
  await guardRequests(fastify);
  mountAuth(fastify, app);
  const closeDashboard = options.webDir === undefined ? undefined : await mountDashboard(fastify, options.webDir);
  const document = openApiDocument(app);
  fastify.get(OPENAPI_URL, (_request, reply) => reply.send(document));
  await app.init();
  await app.listen(options.port, options.host);
  const address = fastify.server.address();
  const port = address !== null && typeof address === 'object' ? address.port : options.port;
  const url = addressOf(options.host, port);
  const token = await app.get(LinksService).ownerToken();
  return {
    url,
    ...(token === undefined ? {} : { ownerLink: `${url}/welcome?token=${token}` }),
    app,
    close: async () => {
      await app.close();
      await closeDashboard?.();
    },
  };
}

function addressOf(host: string, port: number): string {
  const name = host === '0.0.0.0' || host === '::' ? 'localhost' : host.includes(':') ? `[${host}]` : host;
  return `http://${name}:${port}`;
}

type Issue = { readonly message: string; readonly path?: readonly unknown[] | undefined };

function wrongRequest(issues: readonly Issue[]): Problem {
  const places = issues.map((issue) => {
    const path = (issue.path ?? []).map((part) =>
      typeof part === 'object' && part !== null && 'key' in part ? String(part.key) : String(part),
    );
    return { code: 'wrong-request', path: path.join('.'), found: 'a value that does not fit', expected: issue.message };
  });
  const detail = places.map(({ path, expected }) => (path === '' ? expected : `${path}: ${expected}`)).join('; ');
  return new Problem(400, 'wrong-request', detail, { faults: places });
}
