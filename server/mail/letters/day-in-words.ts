const DAY = { weekday: 'long', day: 'numeric', month: 'long' } as const;
const SOON = new Intl.DateTimeFormat('en-GB', { ...DAY, timeZone: 'UTC' });

function withoutComma(words: string): string {
  return words.replace(',', '');
}

/** A day that is near, as "Friday 11 December". A day of the calendar is the same in every zone. */
export function nearDayInWords(day: string): string {
  return withoutComma(SOON.format(new Date(`${day}T00:00:00Z`)));
}

/** A moment as "Tuesday 9 June 2027, 10:00", by the clocks of a time zone. */
export function momentInWords(moment: Date, timeZone: string): string {
  const day = new Intl.DateTimeFormat('en-GB', { ...DAY, year: 'numeric', timeZone });
  const time = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit', timeZone });
  return `${withoutComma(day.format(moment))}, ${time.format(moment)}`;
}

/** A moment's day as "9 June 2027", in a time zone. */
export function dayInWords(moment: Date, timeZone: string): string {
  return new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone }).format(moment);
}
