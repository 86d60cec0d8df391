import type { INestApplication } from '@nestjs/common';
import { DocumentBuilder, SwaggerModule, type OpenAPIObject } from '@nestjs/swagger';
import { VERSION } from '../health/health.controller.js';
import { sessionPaths } from './session-paths.js';

export const OPENAPI_URL = '/api/openapi.json';

export function openApiDocument(app: INestApplication): OpenAPIObject {
  const config = new DocumentBuilder()
    .setTitle('Groundward')
    .setDescription(
      'Lateral design of whole buildings. Results support the judgement of a licensed engineer; local codes and licensed practice govern.',
    )
    .setVersion(VERSION)
    .setOpenAPIVersion('3.1.0')
    .addCookieAuth('groundward.session_token')
    .build();
  const document = SwaggerModule.createDocument(app, config);
  return { ...document, paths: { ...document.paths, ...sessionPaths(), [OPENAPI_URL]: { get: ITSELF } } };
}

const ITSELF = {
  operationId: 'openapi',
  tags: ['operation'],
  responses: {
    '200': { description: 'This document', content: { 'application/json': { schema: { type: 'object' } } } },
  },
};
