import { createHash } from 'node:crypto';
import { canonicalText } from '../journal/entry.js';

/** A definition as it is kept: its RFC 8785 text and the SHA-256 of exactly that text in UTF-8, in hexadecimal. */
export interface Content {
  readonly format: string;
  readonly text: string;
  readonly hash: string;
}

export function contentOf(definition: { readonly format: string }): Content {
  const text = canonicalText(definition);
  return { format: definition.format, text, hash: createHash('sha256').update(text, 'utf8').digest('hex') };
}
