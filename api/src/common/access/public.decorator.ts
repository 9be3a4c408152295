import { SetMetadata } from '@nestjs/common';

export const PUBLIC = Symbol('public');

/** Opens a route to everybody. Without this, `@SignedIn()` or `@Permission()` a route is closed to all. */
export const Public = () => SetMetadata(PUBLIC, true);
