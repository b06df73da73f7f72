import type { LongSectionRow } from '../../../shared/assessment/long-section.ts';
import { linearScale, type Scale } from '../../../shared/presentation/linear-scale.ts';

const ROOM = { left: 46, right: 20, top: 16, bottom: 22 };
/** Between the levels and the settlement below them, and how much of the height the levels take. */
const [BETWEEN, SHARE] = [12, 0.66];
/** The deepest line keeps clear of what stands under it. */
const CLEAR = 1.08;
/** Seen above the ground and below the lowest invert, in metres. */
const BEYOND = 2;

type Panel = { readonly top: number; readonly bottom: number };

/** A drawing along the line: levels above, settlement below, on the same chainage. */
export type AlongLayout = {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly levels: Panel & { readonly y: Scale; readonly from: number; readonly to: number };
  readonly settlement: Panel & { readonly y: Scale; readonly most: number };
  /** How many times as high as long levels are drawn. */
  readonly factor: number;
  readonly x: Scale;
  readonly chainageAt: Scale;
};

/** Lays out a long section and the settlement below it, whose largest is in mm. */
export function alongLayout(
  rows: readonly LongSectionRow[],
  largest: number,
  width: number,
  height: number,
): AlongLayout {
  const length = rows.at(-1)?.chainage ?? 1;
  const to = Math.max(...rows.map(({ ground, crown }) => Math.max(ground, crown))) + BEYOND;
  const from = Math.min(...rows.map(({ invert }) => invert)) - BEYOND;
  const whole = height - ROOM.top - ROOM.bottom - BETWEEN;
  const down = SHARE * whole;
  const fill = down / ((to - from) * ((width - ROOM.left - ROOM.right) / length));
  const factor = Math.max(1, Math.floor(fill));
  const perMetre = Math.min((width - ROOM.left - ROOM.right) / length, down / (to - from) / factor);
  const [left, right] = [ROOM.left, ROOM.left + length * perMetre];
  const levels = { top: ROOM.top, bottom: ROOM.top + (to - from) * perMetre * factor };
  const settlement = { top: levels.bottom + BETWEEN, bottom: height - ROOM.bottom };
  return {
    ...{ width, height, left, right, factor },
    levels: { ...levels, from, to, y: linearScale([from, to], [levels.bottom, levels.top]) },
    settlement: {
      ...settlement,
      most: largest,
      y: linearScale([0, largest * CLEAR], [settlement.top, settlement.bottom]),
    },
    x: linearScale([0, length], [left, right]),
    chainageAt: linearScale([left, right], [0, length]),
  };
}
