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
    const read = <T>(key: symbol): T | undefined =>
      this.reflector.getAllAndOverride<T | undefined>(key, [context.getHandler(), context.getClass()]);
    if (read<boolean>(PUBLIC) === true) return true;

    const actor = actorOf(context.switchToHttp().getRequest<Request>());
    if (actor === undefined) throw new ApiProblem('not-signed-in', 'Sign in first.');
    if (read<boolean>(SIGNED_IN) === true) return true;

    const permission = read<Permission>(PERMISSION);
    if (permission !== undefined && hasPermission(actor.roles, permission)) return true;
    throw new ApiProblem('forbidden', 'Your roles do not allow this.', {
      log: `needs ${permission ?? 'a permission that no route declares'}`,
    });
  }
}
