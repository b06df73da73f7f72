import type { BuildingFieldFacts } from '../schemas/building-fields.ts';
import { COLUMN_FACTS } from '../schemas/column-facts.ts';
import type { RegisterColumn } from '../schemas/register.ts';
import { formatCount } from './format-number.ts';

/**
 * How a column of the register is called and written.
 *
 * Units: as the column. Valid: any column. Source: [own].
 */
export function factsOf(column: RegisterColumn): BuildingFieldFacts {
  return COLUMN_FACTS[column];
}

/**
 * Of a field as it stands inside a sentence: small, unless it is a sign.
 *
 * Units: none. Valid: any column. Source: [own].
 */
export function inSentence(column: RegisterColumn): string {
  const { label } = factsOf(column);
  return /^[A-Z]\/|^Poisson/.test(label) ? label : label.charAt(0).toLowerCase() + label.slice(1);
}

const PLACES: Readonly<Partial<Record<RegisterColumn, number>>> = {
  eavesHeight: 1,
  groundLevel: 2,
  foundingLevel: 2,
  eOverG: 1,
  poisson: 2,
  area: 1,
};
const MOST_PLACES = 3;

/**
 * A figure of a column, with the places that are usual there or as many as it has, up to three.
 *
 * Units: as the column. Valid: finite. Source: [own].
 */
export function formatFigure(column: RegisterColumn, value: number): string {
  const least = PLACES[column] ?? 0;
  const [whole = '', fraction = ''] = String(Number(Math.abs(value).toFixed(MOST_PLACES))).split(
    '.',
  );
  const digits = fraction.padEnd(least, '0');
  const sign = value < 0 && Number(`${whole}.${digits}`) !== 0 ? '\u2212' : '';
  return `${sign}${formatCount(Number(whole))}${digits === '' ? '' : `.${digits}`}`;
}
