import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { inRepository } from '../config/paths.js';

export interface BuildInfo {
  readonly version: string;
  /** Short git hash where there is one, else the version. */
  readonly revision: string;
}

/** What runs here. Reads files, so it is asked once, at the start. */
export function readBuildInfo(): BuildInfo {
  const manifest = JSON.parse(readFileSync(inRepository('package.json'), 'utf8')) as { version: string };
  return { version: manifest.version, revision: gitRevision() ?? manifest.version };
}

function gitRevision(): string | undefined {
  try {
    const options = { cwd: inRepository('.'), encoding: 'utf8' } as const;
    const revision = execFileSync('git', ['rev-parse', '--short=12', 'HEAD'], {
      ...options,
      stdio: ['ignore', 'pipe', 'ignore'],
    }).trim();
    return /^[0-9a-f]{7,40}$/.test(revision) ? revision : undefined;
  } catch {
    return undefined;
  }
}
