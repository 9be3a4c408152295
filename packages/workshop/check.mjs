// npm run check: types, lint, the dependency rule, cycles and format, without running a test.
import { answer } from './house/answer.mjs';
import { ensureInstalled } from './house/install.mjs';
import { runStage, sourceStages } from './house/stages.mjs';

await answer(async () => {
  await ensureInstalled();
  const failed = [];
  for (const stage of sourceStages) if (!(await runStage(stage))) failed.push(stage.name);
  console.log(failed.length === 0 ? '\nAll checks passed.' : `\nFailed: ${failed.join(', ')}.`);
  return failed.length === 0 ? 0 : 1;
});
