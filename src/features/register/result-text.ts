import { isResultFigure, RESULT_VALUES } from '../../../shared/schemas/result-values.ts';
import type { ResultColumn } from '../../../shared/schemas/result-columns.ts';
import { chainageWords } from '../../../shared/presentation/chainage-words.ts';

/** A value of a column of results as people read it. */
export function resultText(column: ResultColumn, value: string | number): string {
  if (typeof value === 'string' || !isResultFigure(column)) return String(value);
  if (column === 'chainage') return chainageWords(value);
  return value.toFixed(RESULT_VALUES[column].digits).replace('-', '\u2212');
}
