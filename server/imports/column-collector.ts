import type { ImportAnswer } from '../../shared/schemas/imports.ts';
import type { Properties, Scalar } from '../importers/source.ts';
import { oneLine } from './parse-value.ts';

type Column = { filled: number; samples: string[] };

const SAMPLES = 5;
const LONGEST_SAMPLE = 60;

/** Counts how far columns are filled and keeps some of what stands in them. */
export function createColumnCollector(names: readonly string[]) {
  const columns = new Map(
    names.map((name): [string, Column] => [name, { filled: 0, samples: [] }]),
  );

  function note(column: Column, value: Scalar | undefined): void {
    const text = value === null || value === undefined ? '' : oneLine(String(value));
    if (text === '') return;
    column.filled += 1;
    if (column.samples.length >= SAMPLES) return;
    const sample = text.slice(0, LONGEST_SAMPLE);
    if (!column.samples.includes(sample)) column.samples.push(sample);
  }

  return {
    add: (properties: Properties): void => {
      for (const [name, column] of columns) note(column, properties[name]);
    },
    columns: (): ImportAnswer['columns'] =>
      [...columns].map(([name, { filled, samples }]) => ({ name, filled, samples })),
  };
}
