const ONE_DAY_MS = 86_400_000;

/** The day of a moment, as `2027-06-09`. */
export function dayOf(moment: Date): string {
  return moment.toISOString().slice(0, 10);
}

/** The moment so many days later. */
export function daysAfter(moment: Date, days: number): Date {
  return new Date(moment.getTime() + days * ONE_DAY_MS);
}
