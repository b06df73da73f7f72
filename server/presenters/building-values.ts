import { completeAttributes } from '../../shared/building/assumed-attributes.ts';
import { knownOfBuilding } from '../../shared/building/known-of-building.ts';
import type { RegisterRow } from '../../shared/schemas/register.ts';
import type { ResultColumn } from '../../shared/schemas/result-columns.ts';
import type { BesideColumn, StandingColumn } from '../../shared/schemas/standing-columns.ts';
import type { Building } from '../models/building.ts';

type Values = Omit<RegisterRow, 'id' | 'reference' | 'centre' | BesideColumn>;

type Results = Pick<RegisterRow, ResultColumn>;

type Standings = Pick<RegisterRow, StandingColumn>;

/** The fields of a building as lists show them, with what a run found of it. */
export type ListedBuilding = Pick<
  Building,
  Exclude<keyof Values, 'assumed'> | 'id' | 'reference' | 'west' | 'south' | 'east' | 'north'
> &
  Results &
  Standings;

/** What leaves the server of a run's findings in a list. */
export function presentResults(building: Results): Results {
  return {
    stage: building.stage,
    chainage: building.chainage,
    offset: building.offset,
    categoryLow: building.categoryLow,
    category: building.category,
    categoryHigh: building.categoryHigh,
    strain: building.strain,
    settlement: building.settlement,
    slope: building.slope,
    breakpoint: building.breakpoint,
    reserve: building.reserve,
    settled: building.settled,
    heldBy: building.heldBy,
  };
}

/** What leaves the server of where a building stands, in a list. */
export function presentStandings({ state, decision, assignedTo }: Standings): Standings {
  return { state, decision, assignedTo };
}

/** What leaves the server of a building's values, with what the method has to assume. */
export function presentValues(building: Pick<Building, Exclude<keyof Values, 'assumed'>>): Values {
  return {
    name: building.name,
    address: building.address,
    use: building.use,
    storeys: building.storeys,
    eavesHeight: building.eavesHeight,
    groundLevel: building.groundLevel,
    foundingLevel: building.foundingLevel,
    foundation: building.foundation,
    construction: building.construction,
    eOverG: building.eOverG,
    poisson: building.poisson,
    listedGrade: building.listedGrade,
    condition: building.condition,
    inspected: building.inspected,
    structureScore: building.structureScore,
    structureReason: building.structureReason,
    featuresScore: building.featuresScore,
    featuresReason: building.featuresReason,
    area: building.area,
    groundLevelFrom: building.groundLevelFrom,
    assumed: [...completeAttributes(knownOfBuilding(building)).assumed],
    version: building.version,
  };
}
