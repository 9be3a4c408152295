import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { endTogether, exitCodeOf, run } from './run-command.mjs';

describe('running another program', () => {
  it('answers with its exit code, or 128 and the number of the signal', async () => {
    expect(await run(process.execPath, ['-e', 'process.exit(3)'])).toBe(3);
    expect(exitCodeOf(0, null)).toBe(0);
    expect(exitCodeOf(null, 'SIGTERM')).toBe(143);
  });

  it('says so when the program does not exist', async () => {
    await expect(run('no-such-program-here', [])).rejects.toThrow(/ENOENT/);
  });
});

describe('standing in front of a server', () => {
  let folder: string;
  beforeAll(() => {
    folder = mkdtempSync(join(tmpdir(), 'merestone-front-'));
    const server = `process.on('SIGTERM', () => { console.log('tidied up'); process.exit(0); });
      process.on('SIGINT', () => process.exit(7));
      setInterval(() => undefined, 1000); console.log('ready');`;
    writeFileSync(join(folder, 'server.mjs'), server);
    const module = JSON.stringify(new URL('./run-command.mjs', import.meta.url).href);
    const front = `import { spawn } from 'node:child_process';
      import { standInFrontOf } from ${module};
      const child = spawn(process.execPath, [process.argv[2]], { stdio: 'inherit' });
      process.exitCode = await standInFrontOf(child);`;
    writeFileSync(join(folder, 'front.mjs'), front);
  });
  afterAll(() => {
    rmSync(folder, { recursive: true });
  });

  const endWith = (signal: NodeJS.Signals) =>
    new Promise<{ code: number | null; output: string }>((resolve) => {
      const front = spawn(process.execPath, [join(folder, 'front.mjs'), join(folder, 'server.mjs')]);
      let output = '';
      front.stdout.setEncoding('utf8').on('data', (text: string) => {
        output += text;
        if (text.includes('ready')) front.kill(signal);
      });
      front.once('exit', (code) => {
        resolve({ code, output });
      });
    });

  it('hands the signal on, waits for the tidy end and passes the exit code on', async () => {
    const { code, output } = await endWith('SIGTERM');
    expect(output).toContain('tidied up');
    expect(code).toBe(0);
    expect((await endWith('SIGINT')).code).toBe(7);
    expect((await endWith('SIGHUP')).code).toBe(0);
  });
});

describe('ending together', () => {
  it('ends the others with the first that ends, and answers with its exit code', async () => {
    const lasting = spawn(process.execPath, ['-e', 'setInterval(() => undefined, 1000)']);
    const failing = spawn(process.execPath, ['-e', 'setTimeout(() => process.exit(5), 100)']);
    const code = await endTogether([
      { name: 'The lasting one', child: lasting },
      { name: 'The failing one', child: failing },
    ]);
    expect(code).toBe(5);
    expect(lasting.signalCode).toBe('SIGTERM');
  });
});
