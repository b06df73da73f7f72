import type { BuildingAnswer } from '../../../shared/schemas/buildings.ts';
import { formatCount } from '../../lib/format-number.ts';

/** One line about a building; a value of null is not known. */
export type BuildingFact = {
  readonly label: string;
  readonly value: string | null;
  readonly unit?: string;
};

/** What registers write for what nobody has found out. */
const NOT_KNOWN = /^(unknown|not known|)$/i;

function words(value: string | null): string | null {
  return value === null || NOT_KNOWN.test(value.trim()) ? null : value;
}

function metres(value: number | null, places: number): string | null {
  if (value === null) return null;
  const fixed = Math.abs(value).toFixed(places);
  return Number(fixed) !== 0 && value < 0 ? `\u2212${fixed}` : fixed;
}

/** Depth of the founding level under the ground, where both are known. */
function foundingDepth({ groundLevel, foundingLevel }: BuildingAnswer): number | null {
  return groundLevel === null || foundingLevel === null ? null : groundLevel - foundingLevel;
}

/** What the register says of a building, line by line. */
export function buildingFacts(building: BuildingAnswer): BuildingFact[] {
  const { storeys } = building;
  return [
    { label: 'Use', value: words(building.use) },
    { label: 'Storeys', value: storeys === null ? null : formatCount(storeys) },
    { label: 'Eaves above ground', value: metres(building.eavesHeight, 1), unit: 'm' },
    { label: 'Construction', value: words(building.construction) },
    { label: 'Foundation', value: words(building.foundation) },
    { label: 'Ground level', value: metres(building.groundLevel, 2), unit: 'm' },
    { label: 'Founding level', value: metres(building.foundingLevel, 2), unit: 'm' },
    { label: 'Founding depth', value: metres(foundingDepth(building), 2), unit: 'm' },
    { label: 'Listing', value: words(building.listedGrade) },
    { label: 'Condition', value: words(building.condition) },
  ];
}
