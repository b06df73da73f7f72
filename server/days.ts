const ONE_DAY_MS = 86_400_000;

/** The day of a moment, as `2027-06-09`. */
export function dayOf(moment: Date): string {
  return moment.toISOString().slice(0, 10);
}

/** The day of a moment in a time zone, as `2027-06-09`. */
export function dayIn(moment: Date, timeZone: string): string {
  // the Swedish way of writing days is that of ISO 8601
  const format = new Intl.DateTimeFormat('sv-SE', { timeZone, dateStyle: 'short' });
  return format.format(moment);
}

/** The moment so many days later. */
export function daysAfter(moment: Date, days: number): Date {
  return new Date(moment.getTime() + days * ONE_DAY_MS);
}
