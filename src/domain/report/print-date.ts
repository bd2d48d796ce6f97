const months = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
];

/** `14 November 2026` in UTC: a date that no country reads differently. Throws RangeError on no date. */
export function printDate(instant: string): string {
  const date = new Date(instant);
  if (Number.isNaN(date.getTime())) throw new RangeError('a date to print must be a date');
  return `${date.getUTCDate()} ${months[date.getUTCMonth()]!} ${date.getUTCFullYear()}`;
}
