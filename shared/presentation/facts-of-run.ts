import type { BuildingSheet } from '../assessment/sheet-of-building.ts';
import { footprintArea } from '../building/footprint-area.ts';
import { BUILDING_FIELD_NAMES } from '../schemas/building-fields.ts';
import type { RunBuilding } from '../schemas/runs.ts';
import type { BuildingValues, OwnColumn } from './shown-value.ts';

/**
 * The facts that a sheet lists, in order. Name and address head it already.
 *
 * Units: none. Valid: read only. Source: [own].
 */
export const LISTED_FACTS: readonly OwnColumn[] = [
  ...BUILDING_FIELD_NAMES.filter((field) => field !== 'name' && field !== 'address'),
  'area',
];

/**
 * The register's values as a run took them, in the shape in which they are shown.
 *
 * Units: as BuildingValues. Valid: a sheet of that building. Source: [own].
 */
export function factsOfRun(
  { facts, version }: Pick<RunBuilding, 'facts' | 'version'>,
  { prepared }: Pick<BuildingSheet, 'prepared'>,
): BuildingValues {
  const { parts, ...values } = facts;
  return {
    ...values,
    area: footprintArea(parts),
    groundLevelFrom: null,
    assumed: [...prepared.attributes.assumed],
    version,
  };
}
