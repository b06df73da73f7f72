import type { RunDetail } from '../schemas/runs.ts';
import type { TitleFields } from '../schemas/evidence.ts';
import type { Mark } from './marks.ts';
import type { PlanBackground } from './plan-material.ts';

/**
 * A drawn sheet: its size, what it is called in an outline, and its marks.
 *
 * Units: mm. Valid: made by `drawnSheets`. Source: [own].
 */
export type Sheet = {
  readonly name: string;
  readonly width: number;
  readonly height: number;
  readonly marks: readonly Mark[];
};

/**
 * What every sheet of a print says of itself: the scheme, the run behind it, the fields of its title block,
 * and the water that its key plan stands on.
 *
 * Units: as the parts. Valid: a complete run. Source: [own].
 */
export type AboutSheets = {
  readonly scheme: {
    readonly name: string;
    readonly crs: { readonly code: number; readonly name: string };
  };
  readonly run: RunDetail;
  readonly fields: TitleFields;
  readonly keyGround: readonly PlanBackground[];
};
