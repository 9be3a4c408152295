/** The revision that a link of the desk leads to; null where it leads elsewhere. */
export function revisionOfHref(href: string): { slug: string; number: number } | null {
  const found = /^\/register\/([^/]+)\/revisions\/(\d+)(?:\/|$)/.exec(href);
  return found?.[1] === undefined ? null : { slug: decodeURIComponent(found[1]), number: Number(found[2]) };
}
