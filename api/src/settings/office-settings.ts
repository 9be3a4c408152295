/** What the office has decided on. */
export interface OfficeSettings {
  readonly officeName: string;
  /** How many favourable reviews an approval rests on. */
  readonly reviewsNeeded: number;
  /** Who confirms appointments besides the technical authorities; needed until there is one. */
  readonly principalId: string | null;
  /** Months after which an approved revision is due for review. */
  readonly reviewDueMonths: number;
}

export const DEFAULT_SETTINGS: OfficeSettings = {
  officeName: 'This office',
  reviewsNeeded: 2,
  principalId: null,
  reviewDueMonths: 36,
};
