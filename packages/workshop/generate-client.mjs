// npm run client: writes the typed client's schema from the OpenAPI document that the built server hands out.
import { writeFileSync } from 'node:fs';
import { clientTypes } from './client-types.mjs';
import { answer } from './house/answer.mjs';
import { ensureInstalled } from './house/install.mjs';
import { ensureServerBuilt } from './house/build-product.mjs';
import { fromRoot } from './house/paths.mjs';
import { serveForTests } from './serve-for-tests.mjs';

await answer(async () => {
  await ensureInstalled();
  await ensureServerBuilt();
  const office = await serveForTests();
  try {
    const response = await fetch(`${office.origin}/api/openapi.json`);
    if (!response.ok) throw new Error(`The contract answered ${String(response.status)}.`);
    const types = await clientTypes(await response.json());
    writeFileSync(fromRoot('packages', 'api-client', 'src', 'schema.generated.ts'), types);
    return 0;
  } finally {
    await office.stop();
  }
});
