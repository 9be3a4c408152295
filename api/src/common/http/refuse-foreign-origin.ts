import type { NextFunction, Request, RequestHandler, Response } from 'express';
import { ApiProblem } from '../problem.js';

const SAFE_METHODS = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses a change that another site's page asks for on behalf of whoever is signed in. A browser always names the
 * page's origin then; scripts name none and are let through. Without a known origin it must be the host asked for.
 */
export function refuseForeignOrigin(origin: string | undefined): RequestHandler {
  return (request: Request, _response: Response, next: NextFunction) => {
    const given = request.headers.origin;
    if (SAFE_METHODS.has(request.method) || given === undefined || isOurs(given, request, origin)) {
      next();
      return;
    }
    throw new ApiProblem('foreign-origin', 'This was asked for by a page of another site.', {
      log: `origin ${JSON.stringify(given.slice(0, 200))}`,
    });
  };
}

function isOurs(given: string, request: Request, origin: string | undefined): boolean {
  if (origin !== undefined) return given === origin;
  return URL.canParse(given) && new URL(given).host === request.headers.host;
}
