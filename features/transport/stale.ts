/** How long an answer counts as fresh, in milliseconds. */
export const STALE = {
  short: 10_000,
  minute: 60_000,
  session: 5 * 60_000,
} as const;
