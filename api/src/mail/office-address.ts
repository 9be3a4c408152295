import type { Config } from '../config/config.js';

/** The address of a page as people reach it. Never taken from a request: whoever asks could name any host. */
export function officeAddress({ origin, port }: Pick<Config, 'origin' | 'port'>, path: string): string {
  return `${origin ?? `http://localhost:${port}`}${path}`;
}
