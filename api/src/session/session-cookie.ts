import { randomBytes } from 'node:crypto';
import { join } from 'node:path';
import type { CookieOptions, RequestHandler } from 'express';
import expressSession from 'express-session';
import { readOrMakeSecret } from '../common/secret-file.js';
import type { Config } from '../config/config.js';
import type { SessionStore } from './session.store.js';

const ID_BYTES = 32;

/** Behind TLS the name begins with `__Host-`, which browsers take only from this very host and over TLS. */
export function sessionCookieName(config: Config): string {
  return config.secure ? '__Host-merestone' : 'merestone';
}

export function sessionCookieOptions(config: Config): CookieOptions {
  return { httpOnly: true, sameSite: 'lax', path: '/', secure: config.secure };
}

export function sessionMiddleware(config: Config, store: SessionStore): RequestHandler {
  const makeSecret = (): string => randomBytes(ID_BYTES).toString('base64url');
  return expressSession({
    name: sessionCookieName(config),
    secret: readOrMakeSecret(join(config.dataFolder, 'session.secret'), makeSecret),
    store,
    genid: () => randomBytes(ID_BYTES).toString('base64url'),
    cookie: sessionCookieOptions(config),
    resave: false,
    saveUninitialized: false,
  });
}
