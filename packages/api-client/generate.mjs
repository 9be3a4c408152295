import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { NestFactory } from '@nestjs/core';
import openapiTS, { astToString } from 'openapi-typescript';
import { AppModule } from '../../api/dist/app.module.js';
import { Config } from '../../api/dist/config/config.js';
import { configureApp } from '../../api/dist/configure-app.js';
import { openApiDocument } from '../../api/dist/openapi/openapi-document.js';

/* Writes src/schema.ts from the OpenAPI document of the built server. Run it after `npm run build` of the server. */

const dataFolder = mkdtempSync(join(tmpdir(), 'merestone-contract-'));
const config = new Config({ port: 0, dataFolder, demo: true, webFolder: dataFolder });
const app = await NestFactory.create(AppModule.with(config), { bodyParser: false, logger: ['error'] });
try {
  configureApp(app);
  await app.init();
  const types = astToString(await openapiTS(structuredClone(openApiDocument(app, config))));
  writeFileSync(new URL('./src/schema.ts', import.meta.url), types);
} finally {
  await app.close();
  rmSync(dataFolder, { recursive: true, force: true });
}
