import type { Range } from '../numerics/range.ts';
import type { SectionAcross, SectionsOfDesign } from './sections-of-design.ts';

/**
 * A section across a designed line that reaches to where its trough ends, the largest settlement in it and
 * the area of its central trough, which is the trough's volume per metre of line.
 *
 * Units: m, volume m³/m. Valid: made by `troughOfSection`; `largest` and `volume` are null where the method
 * refuses at any point of the section. Source: as SectionAcross.
 */
export type TroughOfSection = {
  readonly section: SectionAcross;
  readonly largest: Range | null;
  readonly volume: number | null;
};

/** A trough ends where settlement is under so much of its largest: what lies beyond is under 0.1 % of it. */
const ENDS_AT = 0.001;
const DOUBLINGS = 6;

function largestOf(settlements: readonly Range[]): Range {
  const most = (end: keyof Range) => Math.max(...settlements.map((one) => one[end]));
  return { low: most('low'), central: most('central'), high: most('high') };
}

function hasEnded(settlements: readonly Range[], largest: Range): boolean {
  const ends = [settlements[0], settlements.at(-1)];
  return ends.every((end) => (end?.high ?? 0) <= ENDS_AT * largest.high);
}

/** By the trapezium rule, which is exact to many digits for what rises and falls as a trough does. */
function areaOf({ points }: SectionAcross): number {
  return points.slice(1).reduce((sum, { offset, settlement }, k) => {
    const before = points[k];
    if (before === undefined) return sum;
    const mean = ((before.settlement?.central ?? 0) + (settlement?.central ?? 0)) / 2;
    return sum + (offset - before.offset) * mean;
  }, 0);
}

/**
 * The trough at a chainage of a designed line, looked at as far as asked to either side, and farther until
 * it ends.
 *
 * Units: m. Valid: halfWidth > 0; at most 64 times as far as asked. Source: as SectionAcross.
 */
export function troughOfSection(
  sections: SectionsOfDesign,
  chainage: number,
  halfWidth: number,
): TroughOfSection {
  let [reach, section] = [halfWidth, sections(chainage, halfWidth)];
  for (let doubled = 0; ; doubled++) {
    const settlements = section.points.flatMap(({ settlement }) => settlement ?? []);
    if (settlements.length < section.points.length) {
      return { section, largest: null, volume: null };
    }
    const largest = largestOf(settlements);
    if (doubled === DOUBLINGS || hasEnded(settlements, largest)) {
      return { section, largest, volume: areaOf(section) };
    }
    reach *= 2;
    section = sections(chainage, reach);
  }
}
