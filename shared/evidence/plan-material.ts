import type { PlanPoint } from '../geometry/point.ts';
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
 * All that sheets of a run are drawn from, within some ground.
 *
 * Units: as the parts; contours as SettlementContour. Valid: plain data. Source: [own].
 */
export type PlanMaterial = {
  readonly buildings: readonly PlanBuilding[];
  readonly background: readonly PlanBackground[];
  readonly contours: readonly {
    readonly level: number;
    readonly line: readonly PlanPoint[];
    readonly isClosed: boolean;
  }[];
};
