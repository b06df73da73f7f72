const FORMAT = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  hour: '2-digit',
  minute: '2-digit',
  timeZone: 'UTC',
});

/** A moment as a letter names it: nobody knows in which zone it is read. */
export function timeInWords(time: Date): string {
  return `${FORMAT.format(time)} UTC`;
}
