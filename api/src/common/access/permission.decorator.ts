import { applyDecorators, SetMetadata } from '@nestjs/common';
import { ApiForbiddenResponse, ApiUnauthorizedResponse } from '@nestjs/swagger';
import type { Permission as PermissionName } from '../permissions.js';

export const PERMISSION = Symbol('permission');

/** Opens a route to those whose roles hold the permission. Which object may be touched is the service's question. */
export const Permission = (permission: PermissionName) =>
  applyDecorators(
    SetMetadata(PERMISSION, permission),
    ApiUnauthorizedResponse({ description: 'Not signed in' }),
    ApiForbiddenResponse({ description: `Needs the permission ${permission}` }),
  );
