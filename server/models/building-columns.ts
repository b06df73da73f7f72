import {
  BUILDING_FIELD_NAMES,
  type BuildingField,
  type BuildingValue,
} from '../../shared/schemas/building-fields.ts';

export type BuildingColumn = {
  readonly name: string;
  readonly type: 'text' | 'integer' | 'double precision';
};

/** Where each field of the register is kept: the only names that find their way into SQL. */
export const BUILDING_COLUMNS: Readonly<Record<BuildingField, BuildingColumn>> = {
  name: { name: 'name', type: 'text' },
  address: { name: 'address', type: 'text' },
  use: { name: 'use', type: 'text' },
  storeys: { name: 'storeys', type: 'integer' },
  eavesHeight: { name: 'eaves_height', type: 'double precision' },
  groundLevel: { name: 'ground_level', type: 'double precision' },
  foundingLevel: { name: 'founding_level', type: 'double precision' },
  foundation: { name: 'foundation', type: 'text' },
  construction: { name: 'construction', type: 'text' },
  eOverG: { name: 'e_over_g', type: 'double precision' },
  poisson: { name: 'poisson', type: 'double precision' },
  listedGrade: { name: 'listed_grade', type: 'text' },
  condition: { name: 'condition', type: 'text' },
  inspected: { name: 'inspected', type: 'text' },
  structureScore: { name: 'structure_score', type: 'integer' },
  structureReason: { name: 'structure_reason', type: 'text' },
  featuresScore: { name: 'features_score', type: 'integer' },
  featuresReason: { name: 'features_reason', type: 'text' },
};

/** Every field of a building with its value. */
export type BuildingValues = Readonly<Record<BuildingField, BuildingValue>>;

/** Every field with a value made for it. */
export function eachField(valueOf: (field: BuildingField) => BuildingValue): BuildingValues {
  return {
    name: valueOf('name'),
    address: valueOf('address'),
    use: valueOf('use'),
    storeys: valueOf('storeys'),
    eavesHeight: valueOf('eavesHeight'),
    groundLevel: valueOf('groundLevel'),
    foundingLevel: valueOf('foundingLevel'),
    foundation: valueOf('foundation'),
    construction: valueOf('construction'),
    eOverG: valueOf('eOverG'),
    poisson: valueOf('poisson'),
    listedGrade: valueOf('listedGrade'),
    condition: valueOf('condition'),
    inspected: valueOf('inspected'),
    structureScore: valueOf('structureScore'),
    structureReason: valueOf('structureReason'),
    featuresScore: valueOf('featuresScore'),
    featuresReason: valueOf('featuresReason'),
  };
}

/** The fields as a list of columns, each called by its field in what is read. */
export const FIELD_SELECTION = BUILDING_FIELD_NAMES.map(
  (field) => `${BUILDING_COLUMNS[field].name} as "${field}"`,
).join(', ');
