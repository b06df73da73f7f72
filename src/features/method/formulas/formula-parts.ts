import type { WorkingLine } from '../../../../shared/working.ts';

/** A formula of the method: a line of a working without the figures of one case. */
export type MethodFormula = Omit<WorkingLine, 'inputs' | 'value'>;

/** A part of the method with its formulas and how far they hold. */
export type MethodPart = {
  readonly id: string;
  readonly title: string;
  /** What this part does, in plain words. */
  readonly words: string;
  readonly formulas: readonly MethodFormula[];
  /** How far it holds, and what to watch. */
  readonly limits: readonly string[];
};
