import { holidaysSchema, type Holiday } from '../../../shared/schemas/owner-terms.ts';

/** Public holidays as they are typed, one a line. */
export function linesOfHolidays(holidays: readonly Holiday[]): string {
  return holidays.map(({ date, name }) => `${date} ${name}`).join('\n');
}

/** The holidays of the lines, in the order of the calendar; a line that is none is told by its words. */
export function holidaysOfLines(
  lines: string,
): { readonly holidays: readonly Holiday[] } | { readonly fault: string } {
  const written = lines
    .split('\n')
    .map((line) => line.trim())
    .filter((line) => line !== '');
  const read = written.map((line) => {
    const [date = '', ...name] = line.split(/\s+/);
    return { date, name: name.join(' ') };
  });
  const parsed = holidaysSchema.safeParse(read);
  if (parsed.success) {
    return { holidays: parsed.data.sort((a, b) => a.date.localeCompare(b.date)) };
  }
  const [issue] = parsed.error.issues;
  const line = written[Number(issue?.path[0])];
  return { fault: `${line === undefined ? '' : `“${line}”: `}${issue?.message ?? ''}` };
}
