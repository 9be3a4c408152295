import { mkdirSync, mkdtempSync, renameSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { filesBelow, fingerprint } from './fingerprint.mjs';

describe('fingerprint', () => {
  let folder: string;
  const taken = () => fingerprint(folder, [folder]);

  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'merestone-print-'));
    mkdirSync(join(folder, 'src'));
    writeFileSync(join(folder, 'src', 'a.ts'), 'a');
  });
  afterEach(() => {
    rmSync(folder, { recursive: true });
  });

  it('stays when only times change', () => {
    const before = taken();
    utimesSync(join(folder, 'src', 'a.ts'), 1, 1);
    expect(taken()).toBe(before);
  });

  it('changes with a content, a name, a new file and a word', () => {
    const prints = [taken(), fingerprint(folder, [folder], ['v22'])];
    writeFileSync(join(folder, 'src', 'a.ts'), 'b');
    prints.push(taken());
    renameSync(join(folder, 'src', 'a.ts'), join(folder, 'src', 'b.ts'));
    prints.push(taken());
    writeFileSync(join(folder, 'src', 'c.ts'), '');
    prints.push(taken());
    expect(new Set(prints).size).toBe(prints.length);
  });

  it('passes over what is built, installed or kept', () => {
    for (const name of ['dist', 'node_modules', '.data']) {
      mkdirSync(join(folder, name));
      writeFileSync(join(folder, name, 'x.js'), 'x');
    }
    writeFileSync(join(folder, 'x.tsbuildinfo'), '{}');
    expect(filesBelow(folder)).toEqual([join(folder, 'src', 'a.ts')]);
  });

  it('takes a missing path for empty', () => {
    expect(filesBelow(join(folder, 'nowhere'))).toEqual([]);
  });
});
