/** All invented people of the demo office sign in with this; the sign-in page says so. */
export const DEMO_PASSWORD = 'merestone-demo';

/** Addresses of the demo office end so; `.example` never leads anywhere (RFC 2606). */
export const DEMO_EMAIL_ENDING = '@merestone.example';
