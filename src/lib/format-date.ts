const DATE = { day: 'numeric', month: 'long', year: 'numeric' } as const;
const STYLES = {
  date: DATE,
  weekday: { weekday: 'long', day: 'numeric', month: 'long' },
  'weekday and date': { weekday: 'long', ...DATE },
  clock: { hour: '2-digit', minute: '2-digit' },
} as const;
const TIME = new Intl.DateTimeFormat('en-GB', STYLES.clock);
const SHORT_DAY = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
});

const SHORT_DAY_OF_YEAR = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short' });
const DAY_OF_YEAR = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long' });
const DAY_OF_WEEK = new Intl.DateTimeFormat('en-GB', { weekday: 'long' });
const ONE_DAY = 86_400_000;

function startOfDay(moment: Date): number {
  return new Date(moment.getFullYear(), moment.getMonth(), moment.getDate()).getTime();
}

/** As "today", "yesterday", "Friday", "3 May" or, in another year, "3 May 2025". */
export function formatDaySince(at: string | Date, now: Date): string {
  const moment = new Date(at);
  const days = Math.round((startOfDay(now) - startOfDay(moment)) / ONE_DAY);
  if (days === 0) return 'today';
  if (days === 1) return 'yesterday';
  if (days > 1 && days < 7) return DAY_OF_WEEK.format(moment);
  return moment.getFullYear() === now.getFullYear()
    ? DAY_OF_YEAR.format(moment)
    : formatDay(moment);
}

/** As "1 Dec 2026", for tables. */
export function formatShortDay(at: string | Date): string {
  return SHORT_DAY.format(new Date(at));
}

type Style = keyof typeof STYLES;

/** To make a format takes hundreds of times as long as to use it. */
const kept = new Map<string, Intl.DateTimeFormat>();

function formatOf(style: Style, timeZone: string | undefined): Intl.DateTimeFormat {
  const key = `${style} ${timeZone ?? ''}`;
  const format = kept.get(key) ?? new Intl.DateTimeFormat('en-GB', { ...STYLES[style], timeZone });
  kept.set(key, format);
  return format;
}

/** A day of the calendar is the same everywhere; a moment is told by a zone's clocks, or by those here. */
function inZone(at: string | Date, style: Style, timeZone?: string): string {
  const zone = typeof at === 'string' && at.length === '2026-12-01'.length ? 'UTC' : timeZone;
  return formatOf(style, zone).format(new Date(at)).replace(',', '');
}

/** As "1 December 2026". */
export function formatDay(at: string | Date, timeZone?: string): string {
  return inZone(at, 'date', timeZone);
}

/** As "Tuesday 1 December". */
export function formatWeekday(at: string | Date): string {
  return inZone(at, 'weekday');
}

/** As "Tuesday 1 December 2026, 14:05", for whoever has to be there. */
export function formatWeekdayMoment(at: string | Date, timeZone?: string): string {
  const day = inZone(at, 'weekday and date', timeZone);
  return `${day}, ${inZone(at, 'clock', timeZone)}`;
}

/** As "1 Dec 2026, 14:05", for tables. */
export function formatMoment(at: string | Date): string {
  const moment = new Date(at);
  return `${SHORT_DAY.format(moment)}, ${TIME.format(moment)}`;
}

/** As "1 Dec, 14:05", or in another year "1 Dec 2026, 14:05". */
export function formatShortMoment(at: string | Date, now: Date): string {
  const moment = new Date(at);
  if (moment.getFullYear() !== now.getFullYear()) return formatMoment(at);
  return `${SHORT_DAY_OF_YEAR.format(moment)}, ${TIME.format(moment)}`;
}
