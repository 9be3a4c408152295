import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { foldersAreThere, installedAsLocked } from './install.mjs';

describe('what is installed', () => {
  let folder: string;
  beforeEach(() => (folder = mkdtempSync(join(tmpdir(), 'merestone-lock-'))));
  afterEach(() => {
    rmSync(folder, { recursive: true });
  });

  const put = (name: string, packages: Record<string, object>) => {
    const file = join(folder, name);
    writeFileSync(file, JSON.stringify({ packages }));
    return file;
  };

  const lock = () =>
    put('package-lock.json', {
      '': { name: 'office' },
      api: { version: '0.1.0' },
      'node_modules/@office/api': { link: true },
      'node_modules/a': { version: '1.0.0' },
      'node_modules/a/node_modules/b': { version: '2.0.0' },
      'node_modules/other-platform': { version: '1.0.0', optional: true },
    });

  const asAsked = {
    'node_modules/a': { version: '1.0.0' },
    'node_modules/a/node_modules/b': { version: '2.0.0' },
  };

  it('accepts exactly what was asked for, without the packages of other platforms', () => {
    expect(installedAsLocked(lock(), put('hidden.json', asAsked))).toBe(true);
  });

  it.each([
    ['an older version', { ...asAsked, 'node_modules/a': { version: '0.9.0' } }],
    ['a package too few', { 'node_modules/a': { version: '1.0.0' } }],
    ['a package too many', { ...asAsked, 'node_modules/c': { version: '1.0.0' } }],
  ])('refuses %s', (_, found) => {
    expect(installedAsLocked(lock(), put('hidden.json', found))).toBe(false);
  });

  it('refuses where nothing was installed', () => {
    expect(installedAsLocked(lock(), join(folder, 'nowhere.json'))).toBe(false);
  });

  it('misses the folder of a package, not that of another platform', () => {
    const file = lock();
    mkdirSync(join(folder, 'node_modules', 'a'), { recursive: true });
    expect(foldersAreThere(file, folder)).toBe(false);
    mkdirSync(join(folder, 'node_modules', 'a', 'node_modules', 'b'), { recursive: true });
    expect(foldersAreThere(file, folder)).toBe(true);
  });
});
