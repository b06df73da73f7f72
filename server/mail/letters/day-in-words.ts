const DAY = { weekday: 'long', day: 'numeric', month: 'long', timeZone: 'UTC' } as const;
const SOON = new Intl.DateTimeFormat('en-GB', DAY);
const ANY = new Intl.DateTimeFormat('en-GB', { ...DAY, year: 'numeric' });
const DATE = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  timeZone: 'UTC',
});
const TIME = new Intl.DateTimeFormat('en-GB', {
  hour: '2-digit',
  minute: '2-digit',
  timeZone: 'UTC',
});

function withoutComma(words: string): string {
  return words.replace(',', '');
}

/** A day that is near, as "Friday 11 December". */
export function nearDayInWords(day: string): string {
  return withoutComma(SOON.format(new Date(`${day}T00:00:00Z`)));
}

/** A moment as "Tuesday 9 June 2027, 10:00". */
export function momentInWords(moment: Date): string {
  return `${withoutComma(ANY.format(moment))}, ${TIME.format(moment)}`;
}

/** A day as "9 June 2027". */
export function dayInWords(moment: Date): string {
  return DATE.format(moment);
}
