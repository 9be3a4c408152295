// npm start: from whatever is there (a bare clone, an old build) to a running office.
import { spawn } from 'node:child_process';
import { answer } from './house/answer.mjs';
import { ensureBuilt } from './house/build-product.mjs';
import { ensureInstalled } from './house/install.mjs';
import { fromRoot, root } from './house/paths.mjs';
import { standInFrontOf } from './house/run-command.mjs';

await answer(async () => {
  await ensureInstalled();
  await ensureBuilt();
  const server = spawn(process.execPath, ['--enable-source-maps', fromRoot('api', 'dist', 'main.js')], {
    cwd: root,
    stdio: 'inherit',
  });
  return standInFrontOf(server);
});
