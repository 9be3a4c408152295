import type { Attachment, Licence } from '../../../shared/api/types';
import { inWords } from '../../../shared/format/in-words';

const TYPES: Readonly<Record<Attachment['mediaType'], string>> = {
  'application/pdf': 'PDF',
  'image/png': 'PNG image',
  'image/jpeg': 'JPEG image',
};

export const LICENCE_WORDS: Readonly<Record<Licence, string>> = {
  'may-leave': 'may leave the office',
  'office-only': 'stays in the office',
};

/** The act that makes a document one or the other. */
export const LICENCE_ACTS: Readonly<Record<Licence, string>> = {
  'may-leave': 'Let it leave the office',
  'office-only': 'Keep it in the office',
};

const ACTIVE: Readonly<Record<Attachment['activeContent'][number], string>> = {
  script: 'a script',
  launch: 'a call of another program',
  'embedded-file': 'a file inside it',
  'open-action': 'an act on opening',
  'event-action': 'an act on an event',
  'rich-media': 'embedded media',
  form: 'a form',
  'not-inspected': 'a part that could not be looked into',
};

/** `PDF, 1.2 MB`; megabytes as 10^6 bytes. */
export function documentWords({ mediaType, size }: Pick<Attachment, 'mediaType' | 'size'>): string {
  const kilobytes = size / 1000;
  const amount =
    kilobytes < 1000 ? `${Math.max(1, Math.round(kilobytes))} kB` : `${(kilobytes / 1000).toFixed(1)} MB`;
  return `${TYPES[mediaType]}, ${amount}`;
}

/** What a document would do by itself when it is opened; null for one that only shows. */
export function activeContentWords(activeContent: Attachment['activeContent']): string | null {
  if (activeContent.length === 0) return null;
  return `Contains active content: ${inWords(activeContent.map((kind) => ACTIVE[kind]))}. Open it only in a viewer that runs nothing.`;
}
