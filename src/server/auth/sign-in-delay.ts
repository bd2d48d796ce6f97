/** So many wrong passwords in a row cost nothing. */
export const freeFailures = 5;
const longestSeconds = 300;
/** After a day without a failure the count starts anew. */
export const forgottenAfterSeconds = 24 * 3600;

/**
 * How long an account waits after its n-th wrong password in a row, seconds: nothing for the first
 * five, then 2, 4, 8 … up to five minutes. It never locks for good.
 */
export function delaySeconds(failures: number): number {
  if (failures < freeFailures) return 0;
  return Math.min(2 ** (failures - freeFailures + 1), longestSeconds);
}
