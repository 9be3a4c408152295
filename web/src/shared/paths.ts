/** Where each page lives: routes and links are both built from here. */
export const paths = {
  start: '/register',
  signIn: '/sign-in',
  register: '/register',
  sheet: (slug: string) => `/register/${encodeURIComponent(slug)}`,
  revision: (slug: string, number: number) => `/register/${encodeURIComponent(slug)}/revisions/${number}`,
  geometries: '/geometries',
  geometry: (slug: string) => `/geometries/${encodeURIComponent(slug)}`,
  propertyEquations: '/property-equations',
  propertyEquation: (slug: string) => `/property-equations/${encodeURIComponent(slug)}`,
  journal: '/journal',
} as const;

/** Address of the sign-in page that leads back to where somebody wanted to go. */
export function signInPath(from: string): string {
  return from === '/' || from === paths.start
    ? paths.signIn
    : `${paths.signIn}?from=${encodeURIComponent(from)}`;
}
