/** How a DOI name is written where it is not bare: as a link of the resolver, a URI or with its scheme. */
const LINK = /^(?:https?:\/\/)?(?:www\.)?(?:dx\.)?doi\.org\/|^info:doi\//i;
const SCHEME = /^(?:urn:)?doi(?:\s*:\s*|\s+)/i;

/**
 * Prefix of directory indicator 10 and registrant code (subdivided by dots), slash, suffix of printable characters:
 * the syntax of ISO 26324.
 */
const DOI = /^10\.\d{4,9}(?:\.\d+)*\/[^\s\p{C}]+$/u;
const LONGEST = 400;

export interface DoiName {
  /** The bare name, such as `10.1021/ie50293a010`. */
  readonly name: string;
  /** Its address at the resolver. */
  readonly href: string;
}

/** Reads a DOI, bare or as `doi:…` or a link of the resolver; undefined where the text is none. */
export function readDoi(text: string): DoiName | undefined {
  if (text.length > 2 * LONGEST) return undefined;
  // No DOI ends with the punctuation of the sentence that it was copied from.
  const trimmed = text.trim().replace(/[.,;]+$/, '');
  const name = LINK.test(trimmed) ? decoded(trimmed.replace(LINK, '')) : trimmed.replace(SCHEME, '');
  if (name === undefined || name.length > LONGEST || !DOI.test(name)) return undefined;
  return { name, href: `https://doi.org/${name.split('/').map(encodeURIComponent).join('/')}` };
}

/** DOI names are compared without regard to the case of ASCII letters. */
export function doiKey(name: string): string {
  return name.replace(/[A-Z]+/g, (letters) => letters.toLowerCase());
}

function decoded(path: string): string | undefined {
  try {
    return decodeURIComponent(path);
  } catch {
    return undefined;
  }
}
