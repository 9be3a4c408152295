/** A file of a multipart body, held in memory. */
export interface UploadedDocument {
  /** As the sender wrote it; not to be trusted. */
  readonly originalname: string;
  /** As the sender stated it; not to be trusted. */
  readonly mimetype: string;
  readonly buffer: Buffer;
}
