import type { INestApplication } from '@nestjs/common';
import { DocumentBuilder, SwaggerModule, type OpenAPIObject } from '@nestjs/swagger';
import { VERSION } from '../health/health.controller.js';

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
  return SwaggerModule.createDocument(app, config);
}
