/**
 * How a figure that a run finds of a building is called and shown to people.
 *
 * Units: `unit` after multiplying the record's figure by `scale`; `digits` after the point. Valid: read
 * only. Source: [own].
 */
export type ResultValueFacts = {
  readonly label: string;
  readonly kind: 'number' | 'whole';
  readonly scale: number;
  readonly digits: number;
  readonly unit?: string;
};

/**
 * The figures that a run finds of a building, by their names in the record, in the order in which people
 * read them. Chainage and offset are those of the footprint's middle beside the drawn line, offset positive to
 * the left; categories are numbers, 4 stands for 4 to 5; strain is the central one, settlement and slope
 * are the largest over the bracket.
 *
 * Units: as ResultValueFacts. Valid: names of RunResult. Source: [own].
 */
export const RESULT_VALUES = {
  stage: { label: 'Stage', kind: 'whole', scale: 1, digits: 0 },
  chainage: { label: 'Chainage', kind: 'number', unit: 'm', scale: 1, digits: 0 },
  offset: { label: 'Offset', kind: 'number', unit: 'm', scale: 1, digits: 1 },
  categoryLow: { label: 'Category low', kind: 'whole', scale: 1, digits: 0 },
  category: { label: 'Category central', kind: 'whole', scale: 1, digits: 0 },
  categoryHigh: { label: 'Category high', kind: 'whole', scale: 1, digits: 0 },
  strain: { label: 'Strain', kind: 'number', unit: '%', scale: 100, digits: 4 },
  settlement: { label: 'Settlement', kind: 'number', unit: 'mm', scale: 1000, digits: 1 },
  slope: { label: 'Slope', kind: 'number', unit: 'mm/m', scale: 1000, digits: 2 },
  breakpoint: { label: 'Breakpoint', kind: 'number', scale: 1, digits: 2 },
  reserve: { label: 'Reserve', kind: 'number', scale: 1, digits: 2 },
} as const satisfies Readonly<Record<string, ResultValueFacts>>;

/**
 * The name of a figure that a run finds of a building.
 *
 * Units: none. Valid: a key of RESULT_VALUES. Source: [own].
 */
export type ResultFigure = keyof typeof RESULT_VALUES;

/**
 * Whether a name is that of a figure that a run finds of a building.
 *
 * Units: none. Valid: any text. Source: [own].
 */
export function isResultFigure(name: string): name is ResultFigure {
  return Object.hasOwn(RESULT_VALUES, name);
}
