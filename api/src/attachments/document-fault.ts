/** A file that is not kept; the message says why. */
export class DocumentFault extends Error {
  override readonly name = 'DocumentFault';
}
