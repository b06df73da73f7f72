import { BRACKET_INPUTS } from '../../shared/assessment/sensitivity.ts';
import { CATEGORIES } from '../../shared/damage/categories.ts';
import { standingWords } from '../../shared/presentation/decision-words.ts';
import {
  BUILDING_FIELD_NAMES,
  BUILDING_FIELDS,
  type BuildingField,
} from '../../shared/schemas/building-fields.ts';
import { RESULT_VALUES, type ResultValueFacts } from '../../shared/schemas/result-values.ts';
import type { RunResult } from '../../shared/schemas/runs.ts';
import type { RunRow } from '../models/find-run-rows.ts';
import { headingWith, type ExportColumn, type ExportValue } from './export-file.ts';

type Column = ExportColumn<RunRow>;

/** What can be assumed, as the register calls it; the founding depth follows from its levels. */
const ASSUMED_WORDS: Readonly<Record<string, string>> = {
  ...Object.fromEntries(BUILDING_FIELD_NAMES.map((name) => [name, BUILDING_FIELDS[name].label])),
  foundingDepth: 'Founding depth',
};

/** What has the same value for people and for programs. */
function plain(
  name: string,
  facts: { readonly label: string; readonly kind: Column['kind']; readonly unit?: string },
  value: (row: RunRow) => ExportValue,
): Column {
  const { kind } = facts;
  return { name, heading: headingWith(facts), kind, cell: value, property: value };
}

function fact(name: BuildingField): Column {
  return plain(name, BUILDING_FIELDS[name], ({ facts }) => facts[name]);
}

function text(label: string, name: string, value: (result: RunResult) => string | null): Column {
  return plain(name, { label, kind: 'text' }, ({ result }) => value(result));
}

function list(words: readonly string[]): string | null {
  return words.length === 0 ? null : words.join('; ');
}

export type FigureName = {
  [K in keyof RunResult]: RunResult[K] extends number | null ? K : never;
}[keyof RunResult];

/** Where a building stands is known whatever could not be worked out of it. */
const KNOWN_ALWAYS: ReadonlySet<FigureName> = new Set(['stage', 'chainage', 'offset']);

/** A figure of the record, which keeps noughts of what could not be worked out. */
export function recorded(result: RunResult, name: FigureName): number | null {
  return result.fault !== null && !KNOWN_ALWAYS.has(name) ? null : result[name];
}

/** A figure in the unit of people on sheets, and as the record has it for programs. */
function figure(name: FigureName, facts: ResultValueFacts): Column {
  const { kind, digits, scale } = facts;
  return {
    ...{ name, kind, digits, heading: headingWith(facts) },
    cell: ({ result }) => {
      const value = recorded(result, name);
      return value === null ? null : value * scale;
    },
    property: ({ result }) => recorded(result, name),
  };
}

/** A category in words on sheets; programs want its number. */
function category(name: 'categoryLow' | 'category' | 'categoryHigh'): Column {
  return {
    ...{ name, heading: RESULT_VALUES[name].label, kind: 'text' },
    cell: ({ result }) => {
      const row = CATEGORIES.find((one) => one.category === result[name]);
      return row === undefined ? null : `${row.label} ${row.name}`;
    },
    property: ({ result }) => result[name],
  };
}

function yesOrNo(
  label: string,
  name: 'isSettled' | 'isRow',
  [yes, no]: readonly [string, string],
): Column {
  return {
    ...{ name, heading: label, kind: 'text' },
    cell: ({ result }) => (result[name] === null ? null : result[name] ? yes : no),
    property: ({ result }) => result[name],
  };
}

const { stage, chainage, offset, strain, settlement, slope, breakpoint, reserve } = RESULT_VALUES;

/** What a file says of each building of a run: what the run took of it, all that it found, and what is decided now. */
export const RUN_COLUMNS: readonly Column[] = [
  plain('reference', { label: 'Reference', kind: 'text' }, ({ facts }) => facts.reference),
  ...BUILDING_FIELD_NAMES.map(fact),
  figure('stage', stage),
  figure('chainage', chainage),
  figure('offset', offset),
  category('categoryLow'),
  category('category'),
  category('categoryHigh'),
  figure('strainLow', { ...strain, label: 'Strain low' }),
  figure('strain', { ...strain, label: 'Strain central' }),
  figure('strainHigh', { ...strain, label: 'Strain high' }),
  figure('settlement', settlement),
  figure('slope', slope),
  figure('breakpoint', breakpoint),
  figure('breakpointVolumeLoss', { ...strain, label: 'Volume loss at breakpoint', digits: 2 }),
  figure('reserve', reserve),
  figure('reserveOverHigh', { ...reserve, label: 'Reserve over high' }),
  yesOrNo('Settled', 'isSettled', ['settled', 'sensitive']),
  text('Sensitive to', 'sensitiveTo', ({ sensitiveTo }) =>
    sensitiveTo === null ? null : ({ ...BRACKET_INPUTS }[sensitiveTo] ?? sensitiveTo),
  ),
  text('Held by', 'heldBy', ({ heldBy }) => list(heldBy)),
  text('Rankin’s class', 'rankin', ({ rankin }) => rankin),
  text('Governing wall', 'governingWall', ({ governingWall }) => governingWall),
  yesOrNo('Wall as part of a row', 'isRow', ['yes', 'no']),
  text('Bending', 'mode', ({ mode }) => mode),
  figure('deflectionRatio', { ...strain, label: 'Deflection ratio Δ/L' }),
  figure('horizontalStrain', { ...strain, label: 'Horizontal strain' }),
  figure('wallSettlement', { ...settlement, label: 'Settlement of walls, central' }),
  figure('wallSlope', { ...slope, label: 'Slope along walls, central' }),
  text('Assumed', 'assumed', ({ assumed }) =>
    list(assumed.map((name) => ASSUMED_WORDS[name] ?? name)),
  ),
  text('Warnings', 'warnings', ({ warnings }) => list(warnings)),
  text('Not worked out', 'fault', ({ fault }) => fault),
  plain('decision', { label: 'Decision', kind: 'text' }, ({ now }) => standingWords(now)),
];
