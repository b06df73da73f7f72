import type { ReferenceKey } from './references.ts';

/**
 * One line of a figure's working: the formula, the numbers put into it and what came out.
 * `expression` is plain arithmetic in the names of `inputs`, so that any calculator can repeat it.
 *
 * Units: `unit` is that of `value`; inputs are SI. Valid: written by the code that computes the
 * value, at the moment it does. Source: [own].
 */
export type WorkingLine = {
  readonly symbol: string;
  readonly meaning: string;
  readonly expression: string;
  readonly inputs: Readonly<Record<string, number>>;
  readonly value: number;
  readonly unit: string;
  readonly reference: ReferenceKey;
};

/**
 * Takes the lines of a working as they arise; absent where nobody asked for it.
 *
 * Units: see WorkingLine. Valid: called in the order of computing. Source: [own].
 */
export type Recorder = (line: WorkingLine) => void;
