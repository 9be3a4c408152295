import type { Standing, WithdrawalClass } from '../common/standing.js';

/** A standing to be given, with what is said about it. */
export interface NewStanding {
  readonly standing: Standing;
  readonly note?: string | undefined;
  readonly withdrawalClass?: WithdrawalClass | undefined;
}
