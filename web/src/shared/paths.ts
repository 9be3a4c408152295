/** Where each page lives: routes and links are both built from here. */
export const paths = {
  start: '/',
  signIn: '/sign-in',
  register: '/register',
  sheet: (slug: string) => `/register/${encodeURIComponent(slug)}`,
  revision: (slug: string, number: number) => `/register/${encodeURIComponent(slug)}/revisions/${number}`,
  draftNew: (pattern?: string) =>
    pattern === undefined ? '/register/new' : `/register/new?pattern=${encodeURIComponent(pattern)}`,
  revise: (slug: string) => `/register/${encodeURIComponent(slug)}/revise`,
  review: (slug: string, number: number) =>
    `/register/${encodeURIComponent(slug)}/revisions/${number}/review`,
  differences: (slug: string, from: number, to: number) =>
    `/register/${encodeURIComponent(slug)}/differences?from=${from}&to=${to}`,
  reviews: '/reviews',
  geometries: '/geometries',
  geometry: (slug: string) => `/geometries/${encodeURIComponent(slug)}`,
  propertyEquations: '/property-equations',
  propertyEquation: (slug: string) => `/property-equations/${encodeURIComponent(slug)}`,
  journal: '/journal',
  office: '/office',
  people: '/office/people',
  appointments: '/office/appointments',
  settings: '/office/settings',
  outbox: '/office/outbox',
  letter: (id: string) => `/office/outbox/${encodeURIComponent(id)}`,
  account: '/account',
  notices: '/notices',
  passwordReset: '/password-reset',
} as const;

/** Address of the sign-in page that leads back to where somebody wanted to go. */
export function signInPath(from: string): string {
  return from === paths.start ? paths.signIn : `${paths.signIn}?from=${encodeURIComponent(from)}`;
}
