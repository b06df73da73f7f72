const ISO = /^(\d{4})-(\d{1,2})-(\d{1,2})(?:T[\d:.]+Z?)?$/;
/** The day stands before the month. */
const USUAL = /^(\d{1,2})[./-](\d{1,2})[./-](\d{4})$/;

/** The day that a text says, as 2027-06-09; undefined where it says none. */
export function readDay(text: string): string | undefined {
  const [, year, month, day] = ISO.exec(text) ?? [];
  const [, usualDay, usualMonth, usualYear] = USUAL.exec(text) ?? [];
  const parts = [year ?? usualYear, month ?? usualMonth, day ?? usualDay];
  const said = parts.map((part) => (part ?? '').padStart(2, '0')).join('-');
  const moment = new Date(`${said}T00:00:00Z`);
  if (Number.isNaN(moment.getTime())) return undefined;
  return moment.toISOString().startsWith(said) ? said : undefined;
}
