import type { Category } from '../damage/categories.ts';
import type { PlanPoint } from '../geometry/point.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import type { RunResult } from '../schemas/runs.ts';

/**
 * A building on a plan: its outline as the run took it, how it is called, and what the run found.
 *
 * Units: parts m, result as RunResult. Valid: at least one part. Source: [own].
 */
export type PlanBuilding = {
  readonly id: string;
  readonly reference: string;
  readonly address: string | null;
  readonly parts: readonly (readonly (readonly PlanPoint[])[])[];
  readonly result: Pick<
    RunResult,
    | 'stage'
    | 'categoryLow'
    | 'category'
    | 'categoryHigh'
    | 'settlement'
    | 'strain'
    | 'breakpointVolumeLoss'
  >;
};

/**
 * A street, stretch of water, railway or park under the buildings, in the scheme's grid.
 *
 * Units: m. Valid: lines are open, areas closed rings. Source: [own].
 */
export type PlanBackground = {
  readonly layer: 'streets' | 'water' | 'rail' | 'parks';
  readonly name: string | null;
  readonly isArea: boolean;
  readonly lines: readonly (readonly PlanPoint[])[];
};

/**
 * All that plans of a run are drawn from, within some ground.
 *
 * Units: as the parts. Valid: plain data. Source: [own].
 */
export type PlanMaterial = {
  readonly buildings: readonly PlanBuilding[];
  readonly background: readonly PlanBackground[];
  readonly contours: readonly {
    readonly level: number;
    readonly line: readonly PlanPoint[];
    readonly isClosed: boolean;
  }[];
  readonly design: AlignmentDesign;
};

/**
 * The end of the bracket that a plan shows.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export type ShownEnd = 'low' | 'central' | 'high';

const CATEGORY_AT = { low: 'categoryLow', central: 'category', high: 'categoryHigh' } as const;

/**
 * The category that a plan shows of a building; null where screening let it go or it could not be worked
 * out.
 *
 * Units: none. Valid: any building. Source: as RunResult.
 */
export function categoryShown(
  { result }: Pick<PlanBuilding, 'result'>,
  end: ShownEnd,
): Category | null {
  return result[CATEGORY_AT[end]];
}
