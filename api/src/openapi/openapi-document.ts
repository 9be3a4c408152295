import type { INestApplication } from '@nestjs/common';
import { DocumentBuilder, SwaggerModule, type OpenAPIObject } from '@nestjs/swagger';
import type { Config } from '../config/config.js';
import { readBuildInfo } from '../health/build-info.js';
import { DEFINITION_SCHEMAS } from '../revisions/dto/definition-schema.js';
import { sessionCookieName } from '../session/session-cookie.js';
import { ProblemResponse } from './problem-response.dto.js';

const DESCRIPTION = [
  "The register of a design office's mass transfer correlations, with bounds that hold.",
  'Every refusal is application/problem+json with a type `urn:merestone:problem:<code>`.',
  'Results are estimates from published correlations. They do not replace vendor data, pilot tests, local codes and',
  'rules, or the judgement of the engineer who is responsible for the design.',
].join('\n');

/** The contract of the API, read off the controllers. */
export function openApiDocument(app: INestApplication, config: Config): OpenAPIObject {
  const options = new DocumentBuilder()
    .setTitle('Merestone')
    .setDescription(DESCRIPTION)
    .setVersion(readBuildInfo().version)
    .addCookieAuth(sessionCookieName(config))
    .addGlobalResponse({
      status: 'default',
      description: 'Refused: a problem (RFC 9457) with its code, and the fields or findings concerned',
      content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/ProblemResponse' } } },
    })
    .build();
  const document = SwaggerModule.createDocument(app, options, { extraModels: [ProblemResponse] });
  // The sheet formats are the engine's own schemas; no class repeats them.
  document.components = {
    ...document.components,
    schemas: { ...document.components?.schemas, ...DEFINITION_SCHEMAS },
  };
  return document;
}

/** Serves the contract at /api/openapi.json and a page to read and try it at /api/docs, both from here alone. */
export function serveOpenApi(app: INestApplication, config: Config): void {
  SwaggerModule.setup('api/docs', app, () => openApiDocument(app, config), {
    jsonDocumentUrl: 'api/openapi.json',
    yamlDocumentUrl: 'api/openapi.yaml',
    customSiteTitle: 'Merestone API',
    swaggerOptions: { validatorUrl: null, persistAuthorization: false },
  });
}
