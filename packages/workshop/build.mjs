// npm run build: the server and the screens, where their sources changed.
import { answer } from './house/answer.mjs';
import { ensureBuilt } from './house/build-product.mjs';
import { ensureInstalled } from './house/install.mjs';

await answer(async () => {
  await ensureInstalled();
  await ensureBuilt();
  return 0;
});
