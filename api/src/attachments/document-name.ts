import type { MediaType } from '../common/attachment.js';
import { DocumentFault } from './document-fault.js';

const ENDINGS: Readonly<Record<MediaType, readonly [string, ...string[]]>> = {
  'application/pdf': ['pdf'],
  'image/png': ['png'],
  'image/jpeg': ['jpg', 'jpeg'],
};
const LONGEST = 120;

/**
 * The name to keep for an uploaded file: its last part, without characters that hide, reorder or direct, and with the
 * ending of what it is. Throws a fault where the name says that it is something else.
 */
export function documentName(given: string, mediaType: MediaType): string {
  const last = given.split(/[/\\]/).at(-1) ?? '';
  const plain = last
    .normalize('NFC')
    .replace(/[\p{Cc}\p{Cf}\p{Surrogate}\p{Co}\p{Cn}\uFFFD]/gu, '')
    .replace(/[<>:"|?*]/g, '-')
    .replace(/\s+/g, ' ')
    .trim()
    .replace(/^[.\s]+|[.\s]+$/g, '');
  const [, stem = plain, ending] = /^(.*)\.([A-Za-z0-9]{1,8})$/s.exec(plain) ?? [];
  const endings = ENDINGS[mediaType];
  const shortened = (text: string) => Array.from(text).slice(0, LONGEST).join('').trim() || 'document';
  if (ending === undefined || /^\d+$/.test(ending)) return `${shortened(plain)}.${endings[0]}`;
  if (!endings.includes(ending.toLowerCase())) {
    throw new DocumentFault(`The name ends with .${ending}, but the file is ${endings[0].toUpperCase()}.`);
  }
  return `${shortened(stem)}.${ending.toLowerCase()}`;
}

/** The header that has a browser save a file under its name (RFC 6266), never show it. */
export function contentDisposition(name: string): string {
  const ascii = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/[^\x20-\x7e]|["\\%]/g, '_');
  const encoded = encodeURIComponent(name).replace(
    /['()*]/g,
    (sign) => `%${sign.charCodeAt(0).toString(16).toUpperCase()}`,
  );
  return `attachment; filename="${ascii}"; filename*=UTF-8''${encoded}`;
}
