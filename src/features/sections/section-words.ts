import type { TroughOfSection } from '../../../shared/assessment/trough-of-section.ts';
import type { SettlementOnLine } from '../../../shared/assessment/settlement-along.ts';
import type { Range } from '../../../shared/numerics/range.ts';
import { formatCount } from '../../../shared/presentation/format-number.ts';
import { chainageWords } from '../../../shared/presentation/chainage-words.ts';

const MILLIMETRES = 1000;

/** A settlement in mm, to a tenth. */
export function millimetres(metres: number): string {
  return (metres * MILLIMETRES).toFixed(1);
}

/** A length or level in m, to so many places, with a true minus. */
export function metres(value: number, places: number): string {
  return value.toFixed(places).replace('-', '\u2212');
}

/** A volume of a trough per metre of line, which is an area. */
export function volumeWords(volume: number): string {
  return `${volume.toFixed(2)} m³/m`;
}

function bracketWords({ low, central, high }: Range): string {
  return `${millimetres(central)} mm central, ${millimetres(low)} low, ${millimetres(high)} high`;
}

function standing(count: number): string {
  if (count === 0) return 'No building stands on it.';
  return count === 1 ? 'One building stands on it.' : `${count} buildings stand on it.`;
}

/** What a section across the line shows, for who does not see it. */
export function acrossWords(
  { section, largest, volume }: TroughOfSection,
  scales: { readonly denominator: number; readonly factor: number },
  buildings: number,
): string {
  const trough =
    largest === null || volume === null
      ? 'No settlement is shown here.'
      : `Largest settlement ${bracketWords(largest)}. Trough ${volumeWords(volume)}.`;
  const scale = `scale 1 to ${scales.denominator}, settlement drawn ${scales.factor} times`;
  return `Section across the line at ${chainageWords(section.chainage)}, ${scale}. ${trough} ${standing(buildings)}`;
}

/** Where settlement along the line is largest at its central values; null where there is none. */
export function largestAlong(
  rows: readonly SettlementOnLine[],
): { chainage: number; settlement: Range } | null {
  let found: { chainage: number; settlement: Range } | null = null;
  for (const { chainage, settlement } of rows) {
    if (settlement === null) continue;
    if (found === null || settlement.central > found.settlement.central)
      found = { chainage, settlement };
  }
  return found;
}

function settlementAlongWords(rows: readonly SettlementOnLine[] | null): string {
  if (rows === null) return 'Settlement is being worked out.';
  const largest = largestAlong(rows);
  return largest === null
    ? 'No settlement is shown.'
    : `Largest settlement ${bracketWords(largest.settlement)}, at ${chainageWords(largest.chainage)}.`;
}

/** What a section along the line shows, for who does not see it; null while settlement is not known. */
export function alongWords(
  length: number,
  factor: number,
  rows: readonly SettlementOnLine[] | null,
): string {
  const long = formatCount(Math.round(length));
  return `Section along the line, ${long} m, height drawn ${factor} times length. ${settlementAlongWords(rows)}`;
}
