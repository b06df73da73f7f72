import type { PlanPoint } from '../../../shared/geometry/point.ts';
import type { RunBuilding, RunDetail } from '../../../shared/schemas/runs.ts';

/** Something that was decided of a building, seen at it or done to it. */
export type HistoryLine = {
  readonly date: string;
  readonly what: string;
  readonly by: string;
  readonly detail: string;
};

/** The outline of a building: its parts, each with its rings. */
export type Outline = readonly (readonly (readonly PlanPoint[])[])[];

/** All that a sheet is made from, as plain data. */
export type SheetMaterial = {
  readonly scheme: { readonly name: string };
  readonly run: RunDetail;
  readonly building: Omit<RunBuilding, 'previous' | 'next'>;
  /** What stands round the building, as the run took it. */
  readonly neighbours: readonly Outline[];
  /** The contours of the run, as the text of a list. */
  readonly contours: string;
  readonly history: readonly HistoryLine[];
  /** The seed of the sampled run that is asked for; null where none is. */
  readonly samples: number | null;
  readonly printedAt: string;
};
