import { DATUM_ACCURACIES, SYSTEM_ACCURACIES } from './datum-accuracies.ts';
import type { FileCrs } from './file-crs.ts';

type Side = Pick<FileCrs, 'code' | 'name' | 'datum' | 'grid' | 'accuracy'>;

export type ShiftAccuracy = {
  /** In metres, the worst case; null where no shift is known. */
  readonly metres: number | null;
  readonly words: string;
};

/** Where a grid's stand-in is not in the table, so many metres are assumed. */
const STAND_IN = 5;

function metresOf({ code, datum, grid, accuracy }: Side): number | null {
  const known = (SYSTEM_ACCURACIES[code] ?? DATUM_ACCURACIES[datum])?.metres;
  if (known !== undefined) return known;
  return grid === null ? accuracy : Math.max(STAND_IN, accuracy ?? 0);
}

/** How far footprints may be off because two systems stand on different datums, and a sentence on it. */
export function shiftAccuracy(file: Side, scheme: Side): ShiftAccuracy {
  if (file.code === scheme.code) {
    return {
      metres: 0,
      words: 'It is the scheme’s own system: coordinates are taken as they are.',
    };
  }
  if (file.datum === scheme.datum) {
    return { metres: 0, words: `Both stand on ${file.datum}, so the change of system is exact.` };
  }
  const [one, other] = [metresOf(file), metresOf(scheme)];
  const between = `Between ${file.datum} and ${scheme.datum}`;
  if (one === null || other === null) {
    const words = `${between} no shift is known here: footprints may be some hundred metres off. Look at the map and state a shift.`;
    return { metres: null, words };
  }
  const metres = one + other;
  const grids = [file.grid, scheme.grid].filter((grid) => grid !== null);
  if (grids.length > 0) {
    const words = `${between} a grid of shifts would be exact (${grids.join(', ')}). It is not here; published parameters stand in for it, which may cost up to ${metres} m. Look at the map and state a shift where it shows.`;
    return { metres, words };
  }
  const words = `${between} published parameters shift the footprints, which may cost up to ${metres} m.`;
  return { metres, words };
}
