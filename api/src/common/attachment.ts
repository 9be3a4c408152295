export const OWNER_KINDS = ['revision', 'calculation'] as const;
export type OwnerKind = (typeof OWNER_KINDS)[number];

export const MEDIA_TYPES = ['application/pdf', 'image/png', 'image/jpeg'] as const;
export type MediaType = (typeof MEDIA_TYPES)[number];

/** Whether a document may leave the office in an evidence pack, or its licence keeps it here. */
export const LICENCES = ['may-leave', 'office-only'] as const;
export type Licence = (typeof LICENCES)[number];

/** What a document does by itself when it is opened. `not-inspected`: a part of it could not be looked into. */
export const ACTIVE_CONTENT = [
  'script',
  'launch',
  'embedded-file',
  'open-action',
  'event-action',
  'rich-media',
  'form',
  'not-inspected',
] as const;
export type ActiveContent = (typeof ACTIVE_CONTENT)[number];
