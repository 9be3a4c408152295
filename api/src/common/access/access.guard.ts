import { Injectable, type CanActivate, type ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import type { Request } from 'express';
import { hasPermission, type Permission } from '../permissions.js';
import { ApiProblem } from '../problem.js';
import { actorOf } from './current-actor.decorator.js';
import { PERMISSION } from './permission.decorator.js';
import { PUBLIC } from './public.decorator.js';
import { SIGNED_IN } from './signed-in.decorator.js';

/** Lets nobody onto a route that does not say who may use it. */
@Injectable()
export class AccessGuard implements CanActivate {
  constructor(private readonly reflector: Reflector) {}

  canActivate(context: ExecutionContext): boolean {
    const targets = [context.getHandler(), context.getClass()];
    const says = (key: symbol): boolean =>
      this.reflector.getAllAndOverride<boolean | undefined>(key, targets) ?? false;
    if (says(PUBLIC)) return true;

    const actor = actorOf(context.switchToHttp().getRequest<Request>());
    if (actor === undefined) throw new ApiProblem('not-signed-in', 'Sign in first.');
    if (says(SIGNED_IN)) return true;

    const permission = this.reflector.getAllAndOverride<Permission | undefined>(PERMISSION, targets);
    if (permission !== undefined && hasPermission(actor.roles, permission)) return true;
    throw new ApiProblem('forbidden', 'Your roles do not allow this.', {
      log: `needs ${permission ?? 'a permission that no route declares'}`,
    });
  }
}
