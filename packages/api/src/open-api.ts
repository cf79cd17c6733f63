import type { NestExpressApplication } from '@nestjs/platform-express';
import { DocumentBuilder, type OpenAPIObject, SwaggerModule } from '@nestjs/swagger';
import { cleanupOpenApiDoc, createZodDto } from 'nestjs-zod';
import { problemSchema } from './contract/problem.js';
import { version } from './health/version.js';

export const docsPath = '/api/docs';

class ProblemDto extends createZodDto(problemSchema) {}

/** Describes the API at /api/openapi.json, for people at /api/docs. */
export function serveOpenApi(app: NestExpressApplication): void {
  SwaggerModule.setup(docsPath, app, () => openApiOf(app), {
    jsonDocumentUrl: '/api/openapi.json',
    raw: ['json'],
    customSiteTitle: 'Steelyard API',
    customCss: '.swagger-ui .topbar { display: none }',
    // Its default validator is on another site.
    swaggerOptions: { validatorUrl: null },
  });
}

function openApiOf(app: NestExpressApplication): OpenAPIObject {
  const description =
    'Weigh candidate trial designs for one research question. Requests carry the session cookie that signing in sets; every error is a problem of RFC 9457 with a code.';
  const outline = new DocumentBuilder()
    .setOpenAPIVersion('3.1.0')
    .setTitle('Steelyard API')
    .setDescription(description)
    .setVersion(version)
    .build();
  const document = cleanupOpenApiDoc(
    SwaggerModule.createDocument(app, outline, {
      extraModels: [ProblemDto.Output],
      operationIdFactory: (_, method) => method,
    }),
  );
  const problem = { $ref: '#/components/schemas/ProblemDto_Output' };
  for (const operation of Object.values(document.paths).flatMap((path) => Object.values(path))) {
    operation.responses.default = {
      description: 'A problem',
      content: { 'application/problem+json': { schema: problem } },
    };
  }
  return withPlainNames(document);
}

/** Names schemas after what they describe, not after the classes that carry them. */
function withPlainNames(document: OpenAPIObject): OpenAPIObject {
  const json = JSON.stringify(document);
  return JSON.parse(json.replaceAll('Dto_Output"', '"').replaceAll('Dto"', 'Body"'));
}
