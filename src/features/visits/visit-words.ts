import type { Defect } from '../../../shared/schemas/visits.ts';
import { formatCount } from '../../../shared/presentation/format-number.ts';

/** A defect in a line: "crack 0.4 mm, gable: stepped". */
export function defectWords({ place, kind, width, note }: Defect): string {
  const size = width === null ? '' : ` ${width} mm`;
  return `${kind}${size}, ${place}${note === '' ? '' : `: ${note}`}`;
}

/** "1 photograph", "3 photographs". */
export function countWords(count: number, one: string): string {
  return `${formatCount(count)} ${one}${count === 1 ? '' : 's'}`;
}

/** A building by its reference and what else it is called. */
export function titleOfBuilding(building: {
  readonly reference: string;
  readonly name: string | null;
  readonly address: string | null;
}): string {
  const { reference, name, address } = building;
  const called = name ?? address;
  return called === null ? reference : `${reference} ${called}`;
}
