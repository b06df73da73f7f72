import { ASSUMED, completeAttributes } from '../building/assumed-attributes.ts';
import { knownOfBuilding } from '../building/known-of-building.ts';
import type { RegisterColumn, RegisterRow } from '../schemas/register.ts';
import type { BesideColumn } from '../schemas/standing-columns.ts';
import { factsOf, formatFigure, inSentence } from './field-words.ts';

/**
 * The values of a building, of a row of the register or of its sheet.
 *
 * Units: as the columns. Valid: any building of the register. Source: [own].
 */
export type BuildingValues = Omit<RegisterRow, 'id' | 'centre' | BesideColumn>;

/**
 * The columns that say what a building is, not what was found of it.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export type OwnColumn = Exclude<RegisterColumn, BesideColumn>;

/**
 * A value as it is shown: known, or assumed by the method, or following from another, or not known; `why`
 * tells which.
 *
 * Units: that of the column. Valid: made by `shownValue`. Source: [own].
 */
export type ShownValue =
  | { readonly kind: 'known'; readonly text: string; readonly why?: string }
  | { readonly kind: 'assumed' | 'follows'; readonly text: string; readonly why: string }
  | { readonly kind: 'unknown'; readonly why: string };

const GROUND_FROM = {
  file: 'From a file.',
  hand: 'Written by hand.',
  ground: 'Sampled from the ground of the scheme.',
};

/** What registers write for what nobody has found out. */
const NOT_KNOWN = /^(unknown|not known|)$/i;

function metres(column: RegisterColumn, value: number): string {
  return `${formatFigure(column, value)} m`;
}

/** The level to which a building is taken to go down, where it is not known. */
function foundingShown(building: BuildingValues): ShownValue {
  const { groundLevel, foundingLevel, assumed } = building;
  const depth = `founded ${metres('eavesHeight', ASSUMED.foundingDepth)} below ground`;
  const isAssumed = assumed.includes('foundingDepth');
  if (foundingLevel !== null) {
    const text = formatFigure('foundingLevel', foundingLevel);
    if (!isAssumed) return { kind: 'known', text };
    const gap = groundLevel === null ? 'ground level is not known' : 'this is not below ground';
    return { kind: 'assumed', text, why: `${gap}; assumed: ${depth}` };
  }
  if (groundLevel === null) return { kind: 'unknown', why: `not known; assumed: ${depth}` };
  const level = groundLevel - ASSUMED.foundingDepth;
  const text = formatFigure('foundingLevel', level);
  return { kind: 'assumed', text, why: `assumed: ${metres('foundingLevel', level)}, ${depth}` };
}

const FILLED_IN = ['storeys', 'eavesHeight', 'eOverG', 'poisson'] as const;
type FilledIn = (typeof FILLED_IN)[number];

function isFilledIn(column: OwnColumn): column is FilledIn {
  return FILLED_IN.some((one) => one === column);
}

/** What the method works with where the register has nothing. */
function filledIn(column: FilledIn, building: BuildingValues): ShownValue {
  const complete = completeAttributes(knownOfBuilding(building));
  const text = formatFigure(column, complete[column]);
  if (complete.assumed.includes(column)) {
    const { unit } = factsOf(column);
    return {
      kind: 'assumed',
      text,
      why: `assumed: ${text}${unit === undefined ? '' : ` ${unit}`}`,
    };
  }
  return {
    kind: 'follows',
    text,
    why: `follows from its construction, ${building.construction ?? ''}`,
  };
}

/**
 * A column of a building's own as people read it.
 *
 * Units: as the column. Valid: any building. Source: [own].
 */
export function shownValue(column: OwnColumn, building: BuildingValues): ShownValue {
  if (column === 'foundingLevel') return foundingShown(building);
  const value = building[column];
  if (typeof value === 'string' && !NOT_KNOWN.test(value.trim()))
    return { kind: 'known', text: value };
  if (typeof value === 'number') {
    const from = column === 'groundLevel' ? building.groundLevelFrom : null;
    // worked out of the outline: more places would say more than is known
    const text = formatFigure(column, column === 'area' ? Number(value.toFixed(1)) : value);
    return { kind: 'known', text, ...(from !== null && { why: GROUND_FROM[from] }) };
  }
  if (isFilledIn(column)) return filledIn(column, building);
  return { kind: 'unknown', why: `${inSentence(column)} is not known` };
}
