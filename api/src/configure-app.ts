import type { NestExpressApplication } from '@nestjs/platform-express';
import { ProblemFilter } from './common/http/problem.filter.js';
import { BODY_LIMIT_BYTES, isReadHere, readJsonBody } from './common/http/read-json-body.js';
import { refuseForeignOrigin } from './common/http/refuse-foreign-origin.js';
import { noStore, securityHeaders } from './common/http/security-headers.js';
import { validationPipe } from './common/http/validation-pipe.js';
import { Config } from './config/config.js';
import { serveOpenApi } from './openapi/openapi-document.js';
import { serveScreens } from './serve-screens.js';
import { sessionMiddleware } from './session/session-cookie.js';
import { SessionStore } from './session/session.store.js';
import { SignInPassport } from './session/sign-in-passport.js';

/**
 * All that a request passes before and after its controller; the same in the server and in its tests. The app must be
 * made without Nest's own body parser.
 */
export function configureApp(app: NestExpressApplication): void {
  const config = app.get(Config);
  app.disable('x-powered-by', 'etag');
  // Behind TLS there is a proxy on this machine or network; only its word on address and scheme is taken.
  if (config.secure) app.set('trust proxy', 'loopback, linklocal, uniquelocal');
  app.enableShutdownHooks();
  app.setGlobalPrefix('api');

  app.use(securityHeaders(config.secure));
  serveScreens(app, config.webFolder);
  app.use('/api', noStore, refuseForeignOrigin(config.origin));
  app.useBodyParser('raw', { type: isReadHere, limit: BODY_LIMIT_BYTES, inflate: false });
  app.use(readJsonBody);
  app.use(sessionMiddleware(config, app.get(SessionStore)), app.get(SignInPassport).middleware());
  serveOpenApi(app, config);

  app.useGlobalPipes(validationPipe());
  app.useGlobalFilters(new ProblemFilter());
}
