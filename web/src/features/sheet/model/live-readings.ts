import type { Finding } from '@merestone/engine';

/** A value of the duty, in the symbol's unit on the sheet. */
export interface LiveValue {
  value: number;
  unit: string;
  /** As somebody gave it, so that it is shown to the digit. */
  given?: boolean;
}

/** What the duty beside the sheet comes to, for its strips and its table of symbols. */
export interface LiveReadings {
  findings: readonly Finding[];
  /** By symbol. */
  values: Readonly<Record<string, LiveValue>>;
}

export const NO_READINGS: LiveReadings = { findings: [], values: {} };
