/** Text that cannot be taken as citations at all; the message says where and why. */
export class CitationFault extends Error {
  override readonly name = 'CitationFault';

  constructor(
    message: string,
    readonly field: 'text' | 'format' = 'text',
  ) {
    super(message);
  }
}

/** Something a person should look at in what was read. */
export interface CitationProblem {
  /** `items.2.DOI` for what was read; `text` for what was not. */
  readonly field: string;
  readonly message: string;
}
