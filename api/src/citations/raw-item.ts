/** One reference as its format gives it, before it is cleaned. */
export interface RawItem {
  /** Where it stands, for a sentence. */
  readonly name: string;
  /** CSL-JSON of any form; undefined where it could not be read. */
  readonly value: unknown;
  readonly problems: readonly string[];
}
