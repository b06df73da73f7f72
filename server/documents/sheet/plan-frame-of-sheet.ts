import { planFrame, type PlanFrame } from '../../../shared/presentation/plan-frame.ts';
import { RULER_SCALES } from '../../../shared/presentation/true-scale.ts';
import { POINTS_PER_PIXEL } from '../pdf/pixels.ts';
import type { Outline } from './sheet-material.ts';
import { SHEET_WIDTH } from './sheet-width.ts';

/** In pixels: beside the facts, and over the whole width for what would be too small there. */
const BESIDE = { width: 344, height: 320 } as const;
const WHOLE = { width: SHEET_WIDTH / POINTS_PER_PIXEL, height: 420 } as const;
/** At a smaller scale walls lie closer than their letters. */
const SMALLEST_BESIDE = 500;

function frameIn(parts: Outline, { width, height }: { width: number; height: number }): PlanFrame {
  return planFrame(parts, width, { height, scales: RULER_SCALES });
}

/** The piece of ground that is drawn round a building, at a scale that a ruler has. */
export function sheetPlanFrame(parts: Outline): PlanFrame {
  const narrow = frameIn(parts, BESIDE);
  if (narrow.denominator <= SMALLEST_BESIDE) return narrow;
  const wide = frameIn(parts, WHOLE);
  return wide.denominator < narrow.denominator ? wide : narrow;
}
