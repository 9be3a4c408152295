import type { Finding } from '@merestone/engine';

/** What the duty beside the sheet comes to, for its strips and its table of symbols. */
export interface LiveReadings {
  findings: readonly Finding[];
  /** Values by symbol, in the symbol's unit on the sheet. */
  values: Readonly<Record<string, { value: number; unit: string }>>;
}

export const NO_READINGS: LiveReadings = { findings: [], values: {} };
