import type { Standing, WithdrawalClass } from '../common/standing.js';

/** A standing to be given, with what is said about it. */
export interface NewStanding {
  readonly standing: Standing;
  readonly note?: string | undefined;
  readonly withdrawalClass?: WithdrawalClass | undefined;
  /** Of a withdrawal: slug of the correlation to turn to instead. */
  readonly successor?: string | undefined;
  /** Of a suspension: the report that is being looked into. */
  readonly problemReportId?: number | undefined;
}
