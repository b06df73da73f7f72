const DAY = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric' });
const WEEKDAY = new Intl.DateTimeFormat('en-GB', {
  weekday: 'long',
  day: 'numeric',
  month: 'long',
});
const TIME = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });
const SHORT_DAY = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
});

/** As "1 December 2026". */
export function formatDay(at: string | Date): string {
  return DAY.format(new Date(at));
}

/** As "Tuesday 1 December". */
export function formatWeekday(at: string | Date): string {
  return WEEKDAY.format(new Date(at)).replace(',', '');
}

/** As "1 Dec 2026, 14:05", for tables. */
export function formatMoment(at: string | Date): string {
  const moment = new Date(at);
  return `${SHORT_DAY.format(moment)}, ${TIME.format(moment)}`;
}
