import { isAbsolute, resolve } from 'node:path';
import { Config } from './config.js';
import { inRepository } from './paths.js';

type Environment = Readonly<Record<string, string | undefined>>;

/** Settings that cannot be used, each with its variable and what would be right. */
export class ConfigError extends Error {
  override readonly name = 'ConfigError';

  constructor(readonly failures: readonly string[]) {
    super(
      ['Merestone cannot start with these settings:', ...failures.map((line) => `  - ${line}`)].join('\n'),
    );
  }
}

const DEFAULT_PORT = 4170;

/** Reads every setting from the environment, or throws one error that lists all that is wrong. */
export function readConfig(environment: Environment): Config {
  const failures: string[] = [];
  const config = new Config({
    port: readPort(environment.MERESTONE_PORT, failures),
    dataFolder: readFolder(environment.MERESTONE_DATA),
    demo: readFlag('MERESTONE_DEMO', environment.MERESTONE_DEMO, true, failures),
    library: readFlag('MERESTONE_LIBRARY', environment.MERESTONE_LIBRARY, true, failures),
    smtpUrl: readUrl('MERESTONE_SMTP_URL', environment.MERESTONE_SMTP_URL, ['smtp:', 'smtps:'], failures)
      ?.href,
    origin: readOrigin(environment.MERESTONE_ORIGIN, failures),
    webFolder: inRepository('web/dist'),
  });
  if (failures.length > 0) throw new ConfigError(failures);
  return config;
}

function given(text: string | undefined): string | undefined {
  const trimmed = text?.trim();
  return trimmed === '' ? undefined : trimmed;
}

function readPort(text: string | undefined, failures: string[]): number {
  const value = given(text);
  if (value === undefined) return DEFAULT_PORT;
  const port = /^\d{1,5}$/.test(value) ? Number(value) : Number.NaN;
  if (port >= 0 && port <= 65_535) return port;
  failures.push(`MERESTONE_PORT is "${value}"; it must be a whole number from 0 to 65535.`);
  return DEFAULT_PORT;
}

function readFolder(text: string | undefined): string {
  const value = given(text);
  if (value === undefined) return inRepository('.data');
  return isAbsolute(value) ? value : resolve(value);
}

function readFlag(name: string, text: string | undefined, fallback: boolean, failures: string[]): boolean {
  const value = given(text)?.toLowerCase();
  if (value === undefined) return fallback;
  if (value === '1' || value === 'true') return true;
  if (value === '0' || value === 'false') return false;
  failures.push(`${name} is "${value}"; it must be 1 or 0.`);
  return fallback;
}

function readUrl(
  name: string,
  text: string | undefined,
  schemes: readonly string[],
  failures: string[],
): URL | undefined {
  const value = given(text);
  if (value === undefined) return undefined;
  const url = URL.canParse(value) ? new URL(value) : undefined;
  if (url !== undefined && schemes.includes(url.protocol) && url.host !== '') return url;
  // The value itself may hold a password, so it is not repeated.
  failures.push(`${name} is not an address that begins with ${schemes.map((s) => `${s}//`).join(' or ')}.`);
  return undefined;
}

function readOrigin(text: string | undefined, failures: string[]): string | undefined {
  const url = readUrl('MERESTONE_ORIGIN', text, ['http:', 'https:'], failures);
  if (url === undefined) return undefined;
  if (url.pathname !== '/' || url.search !== '' || url.hash !== '' || url.username !== '') {
    failures.push('MERESTONE_ORIGIN must be scheme, host and port alone, such as https://register.example.');
  }
  return url.origin;
}
