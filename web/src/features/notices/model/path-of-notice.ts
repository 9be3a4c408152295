/** The page a notice leads to; null where it names none of this application. */
export function pathOfNotice(href: string): string | null {
  return /^\/(?![/\\])/.test(href) ? href : null;
}
