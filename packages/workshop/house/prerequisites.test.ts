import { chmodSync, mkdtempSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { delimiter, join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { CannotGoOn, demand, findCommand, missingForInstalling, nodeIsSupported } from './prerequisites.mjs';

describe('what must be there before anything happens', () => {
  let folder: string;

  const putCommand = (name: string, mode = 0o755) => {
    writeFileSync(join(folder, name), '#!/bin/sh\n');
    chmodSync(join(folder, name), mode);
  };

  beforeEach(() => (folder = mkdtempSync(join(tmpdir(), 'merestone-path-'))));
  afterEach(() => {
    rmSync(folder, { recursive: true });
  });

  it.each([
    ['20.18.3', false],
    ['20.19.0', true],
    ['20.20.2', true],
    ['21.7.0', false],
    ['22.11.0', false],
    ['22.12.0', true],
    ['24.0.0', true],
    ['18.20.4', false],
  ])('Node %s: %s', (version, supported) => {
    expect(nodeIsSupported(version)).toBe(supported);
  });

  it('finds a command in a later folder of the path, and only an executable file', () => {
    putCommand('make');
    putCommand('g++', 0o644);
    mkdirSync(join(folder, 'python3'));
    const path = [join(folder, 'nowhere'), folder].join(delimiter);
    expect(findCommand('make', path)).toBe(join(folder, 'make'));
    expect(findCommand('g++', path)).toBeUndefined();
    expect(findCommand('python3', path)).toBeUndefined();
  });

  it('names each tool that is missing and how to get it', () => {
    putCommand('npm');
    putCommand('make');
    const missing = missingForInstalling(folder);
    expect(missing).toHaveLength(2);
    expect(missing[0]).toMatch(/^python3 is missing.*apt-get install python3/);
    expect(missing[1]).toMatch(/^g\+\+ is missing.*apt-get install g\+\+/);
  });

  it('asks for nothing where all is there', () => {
    for (const name of ['npm', 'python3', 'make', 'g++']) putCommand(name);
    expect(missingForInstalling(folder)).toEqual([]);
  });

  it('stops with every reason at once', () => {
    expect(() => {
      demand(['a is missing', 'b is missing']);
    }).toThrow(CannotGoOn);
    expect(() => {
      demand([]);
    }).not.toThrow();
  });
});
