import { paths } from '../../../shared/paths';

/** Where to go after signing in: only a path of this application, whatever the address bar says. */
export function pathWithin(from: string | null): string {
  const inside = from !== null && /^\/(?![/\\])/.test(from) && !from.startsWith(paths.signIn);
  return inside ? from : paths.start;
}
