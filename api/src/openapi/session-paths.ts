/** Sign-in, sign-out and the session, which the accounts library answers. */
import type { OpenAPIObject } from '@nestjs/swagger';
import { z } from 'zod';
import { ProblemDocument } from '../faults/problem.js';
import { jsonSchema } from './decorators.js';

const Person = z.looseObject({ id: z.string(), name: z.string(), email: z.string() });
const SignIn = z.looseObject({ email: z.email(), password: z.string(), rememberMe: z.boolean().optional() });
const SignedIn = z.looseObject({ user: Person });
const SignedOut = z.looseObject({ success: z.literal(true) });
const Session = z.looseObject({ session: z.looseObject({ expiresAt: z.iso.datetime() }), user: Person }).nullable();

export function sessionPaths(): OpenAPIObject['paths'] {
  return {
    '/api/auth/sign-in/email': {
      post: {
        operationId: 'signIn',
        tags: ['people'],
        requestBody: { required: true, content: json(SignIn) },
        responses: { '200': done(SignedIn), ...problems(400, 401, 403, 429) },
      },
    },
    '/api/auth/sign-out': {
      post: { operationId: 'signOut', tags: ['people'], responses: { '200': done(SignedOut), ...problems(403) } },
    },
    '/api/auth/get-session': {
      get: { operationId: 'session', tags: ['people'], responses: { '200': done(Session) } },
    },
  };
}

function json(schema: z.ZodType) {
  return { 'application/json': { schema: jsonSchema(schema) } };
}

function done(schema: z.ZodType) {
  return { description: 'Done', content: json(schema) };
}

function problems(...statuses: number[]) {
  const content = { 'application/problem+json': { schema: jsonSchema(ProblemDocument) } };
  return Object.fromEntries(statuses.map((status) => [String(status), { description: 'Problem', content }]));
}
