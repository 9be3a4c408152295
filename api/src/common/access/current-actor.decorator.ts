import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import type {} from 'passport';
import type { Actor } from '../actor.js';
import { ApiProblem } from '../problem.js';

/** The signed-in person as an actor; passport puts it on the request. */
export function actorOf(request: Request): Actor | undefined {
  return request.user;
}

export const CurrentActor = createParamDecorator((_: unknown, context: ExecutionContext): Actor => {
  const actor = actorOf(context.switchToHttp().getRequest<Request>());
  if (actor === undefined) throw new ApiProblem('not-signed-in', 'Sign in first.');
  return actor;
});

declare global {
  // Passport declares the signed-in user as this interface; it is our actor.
  namespace Express {
    interface User extends Actor {
      readonly id: string;
    }
  }
}
