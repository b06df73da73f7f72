import { numberOf } from '../../lib/number-of.ts';

const WITH_PLUS = /^(\d+)\+(\d{3}(?:[.,]\d*)?)$/;
const KILOMETRE = 1000;

/** The chainage that somebody wrote, in metres or as `2+645`; null where it is none. */
export function chainageOfText(text: string): number | null {
  const [, kilometres, rest] = WITH_PLUS.exec(text.trim()) ?? [];
  if (kilometres !== undefined && rest !== undefined) {
    return Number(kilometres) * KILOMETRE + Number(rest.replace(',', '.'));
  }
  const metres = numberOf(text);
  return metres === null || metres < 0 ? null : metres;
}
