import type { NestExpressApplication } from '@nestjs/platform-express';
import { DocumentBuilder, type OpenAPIObject, SwaggerModule } from '@nestjs/swagger';

/** The document of every route with its schemas. */
export function openApiDocument(app: NestExpressApplication): OpenAPIObject {
  const about = new DocumentBuilder()
    .setTitle('Weighhouse')
    .setDescription(
      'Case conferences and second opinions. Supports a panel’s discussion; it is not a diagnosis and replaces no clinical judgement.',
    )
    .setVersion('1')
    .addCookieAuth('weighhouse_session')
    .build();
  return SwaggerModule.createDocument(app, about);
}

/** Serves the document at /api/openapi.json; no page of another maker's look beside it. */
export function setUpOpenApi(app: NestExpressApplication): void {
  SwaggerModule.setup('api/docs', app, () => openApiDocument(app), {
    ui: false,
    raw: ['json'],
    jsonDocumentUrl: 'api/openapi.json',
  });
}
