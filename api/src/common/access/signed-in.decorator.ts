import { SetMetadata } from '@nestjs/common';

export const SIGNED_IN = Symbol('signed-in');

/** Opens a route to everybody who is signed in, whatever the roles: for one's own session and the like. */
export const SignedIn = () => SetMetadata(SIGNED_IN, true);
