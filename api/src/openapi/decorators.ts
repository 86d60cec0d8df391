/** OpenAPI from the same zod schemas that check requests and describe answers. */
import { applyDecorators } from '@nestjs/common';
import { ApiBody, ApiHeader, ApiQuery, ApiResponse, type OpenAPIObject } from '@nestjs/swagger';
import { jsonSchemaOf } from '@groundward/engine/building/json-schema';
import type { z } from 'zod';
import { ProblemDocument } from '../faults/problem.js';

type SchemaObject = Exclude<NonNullable<NonNullable<OpenAPIObject['components']>['schemas']>[string], { $ref: string }>;

export function jsonSchema(schema: z.ZodType): SchemaObject {
  // An OpenAPI document has its own dialect, and addresses of its own.
  const { $schema: _dialect, $id: _address, id: _id, ...body } = jsonSchemaOf(schema);
  return body;
}

/** What a route answers when it is done, and the statuses of its problems. */
export function Answers(
  status: number,
  schema: z.ZodType | string | undefined,
  problems: readonly number[] = [],
): MethodDecorator {
  const done =
    schema === undefined
      ? ApiResponse({ status, description: 'Done' })
      : typeof schema === 'string'
        ? ApiResponse({ status, description: 'Done', content: { [schema]: { schema: { type: 'string' } } } })
        : ApiResponse({ status, description: 'Done', content: { 'application/json': { schema: jsonSchema(schema) } } });
  return applyDecorators(
    done,
    ...problems.map((code) =>
      ApiResponse({
        status: code,
        description: 'Problem',
        content: { 'application/problem+json': { schema: jsonSchema(ProblemDocument) } },
      }),
    ),
  );
}

export function Takes(schema: z.ZodType): MethodDecorator {
  return applyDecorators(ApiBody({ required: true, schema: jsonSchema(schema) }));
}

/** The query's parameters, one by one. */
export function Asks(shape: z.ZodObject): MethodDecorator {
  return applyDecorators(
    ...Object.entries(shape.shape).map(([name, schema]) =>
      ApiQuery({
        name,
        required: !(schema as z.ZodType).safeParse(undefined).success,
        schema: jsonSchema(schema as z.ZodType),
      }),
    ),
  );
}

/** A write that must name the version it saw. */
export function NamesVersion(): MethodDecorator {
  return applyDecorators(ApiHeader({ name: 'If-Match', required: true, description: 'The ETag that the caller saw' }));
}
