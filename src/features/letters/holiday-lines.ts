import type { Holiday } from '../../../shared/schemas/owner-terms.ts';

/** Public holidays as they are typed, one a line. */
export function linesOfHolidays(holidays: readonly Holiday[]): string {
  return holidays.map(({ date, name }) => `${date} ${name}`).join('\n');
}

/** What the lines say, in the order of the calendar; whether they are holidays is not looked at. */
export function holidaysOfLines(lines: string): readonly Holiday[] {
  return lines
    .split('\n')
    .map((line) => line.trim())
    .filter((line) => line !== '')
    .map((line) => {
      const [date = '', ...name] = line.split(/\s+/);
      return { date, name: name.join(' ') };
    })
    .sort((a, b) => a.date.localeCompare(b.date));
}

/** What is wrong with holidays in the settings, with the line that is meant. */
export function faultOfHolidays(
  holidays: readonly Holiday[],
  { path, message }: { readonly path: readonly PropertyKey[]; readonly message: string },
): string {
  const holiday = holidays[Number(path[1])];
  return holiday === undefined ? message : `“${linesOfHolidays([holiday]).trim()}”: ${message}`;
}
