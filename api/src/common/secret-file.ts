import { readFileSync, writeFileSync } from 'node:fs';

/** Reads a secret that only the server's own account may read; makes one the first time. */
export function readOrMakeSecret(file: string, make: () => string): string {
  try {
    return readFileSync(file, 'utf8');
  } catch (error) {
    if (!(error instanceof Error && 'code' in error && error.code === 'ENOENT')) throw error;
  }
  const secret = make();
  writeFileSync(file, secret, { mode: 0o600, flag: 'wx' });
  return secret;
}
