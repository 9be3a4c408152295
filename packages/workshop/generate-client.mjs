// npm run client: writes the typed client's schema from the OpenAPI document that the built server hands out.
import { writeFileSync } from 'node:fs';
import openapiTypes, { astToString } from 'openapi-typescript';
import ts from 'typescript';
import { answer } from './house/answer.mjs';
import { ensureInstalled } from './house/install.mjs';
import { ensureServerBuilt } from './house/build-product.mjs';
import { fromRoot } from './house/paths.mjs';
import { serveForTests } from './serve-for-tests.mjs';

/** A file in a form or an answer is a Blob to the screens, which the contract calls a binary string. */
const fileAsBlob = (/** @type {{ format?: string }} */ { format }) =>
  format === 'binary' ? ts.factory.createTypeReferenceNode('Blob') : undefined;

await answer(async () => {
  await ensureInstalled();
  await ensureServerBuilt();
  const office = await serveForTests();
  try {
    const response = await fetch(`${office.origin}/api/openapi.json`);
    if (!response.ok) throw new Error(`The contract answered ${String(response.status)}.`);
    const types = astToString(await openapiTypes(await response.json(), { transform: fileAsBlob }));
    writeFileSync(fromRoot('packages', 'api-client', 'src', 'schema.generated.ts'), types);
    return 0;
  } finally {
    await office.stop();
  }
});
