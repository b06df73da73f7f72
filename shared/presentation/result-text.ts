import type { ResultColumn } from '../schemas/result-columns.ts';
import { isResultFigure, RESULT_VALUES } from '../schemas/result-values.ts';
import { chainageWords } from './chainage-words.ts';

/**
 * A value of a column of results as people read it.
 *
 * Units: those of the column. Valid: finite. Source: [own].
 */
export function resultText(column: ResultColumn, value: string | number): string {
  if (typeof value === 'string' || !isResultFigure(column)) return String(value);
  if (column === 'chainage') return chainageWords(value);
  return value.toFixed(RESULT_VALUES[column].digits).replace('-', '\u2212');
}
