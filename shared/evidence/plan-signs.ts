import { formatCount } from '../presentation/format-number.ts';
import type { GroundFrame } from './ground-frame.ts';
import { boxMark, lineMark, type Mark, type Rectangle, type Spot } from './marks.ts';

const THIN = { ink: 'ink', width: 0.2 } as const;
const BACKED = { fill: 'paper', stroke: THIN } as const;
/** From the neat line to a sign, and the size of the north point's box, in mm. */
const [ASIDE, WIDE, TALL] = [3, 14, 22];

/**
 * Where the north point stands: at the top right of the window.
 *
 * Units: mm. Valid: any window. Source: [own].
 */
export function northBox({ window }: Pick<GroundFrame, 'window'>): Rectangle {
  const [right, top] = [window.right - ASIDE, window.top + ASIDE];
  return { left: right - WIDE, top, right, bottom: top + TALL };
}

/**
 * The north point, towards grid north.
 *
 * Units: mm. Valid: any frame. Source: [own].
 */
export function northMarks(frame: Pick<GroundFrame, 'window' | 'right'>): Mark[] {
  const box = northBox(frame);
  const middle: Spot = [(box.left + box.right) / 2, box.top + 9.5];
  const [c, s] = frame.right;
  // grid north is to the left of what runs to the right of the sheet
  const spot = (aside: number, ahead: number): Spot => [
    middle[0] + aside * c + ahead * s,
    middle[1] + aside * s - ahead * c,
  ];
  const half = (side: number): Mark => ({
    ...{ kind: 'shape', isClosed: true, fill: side < 0 ? 'ink' : 'paper', stroke: THIN },
    rings: [[spot(0, 7), spot(2.6 * side, -6), spot(0, -3.6)]],
  });
  return [
    boxMark(box, BACKED),
    half(-1),
    half(1),
    {
      ...{ kind: 'words', words: 'N', size: 8, isStrong: true, anchor: 'middle' },
      at: [middle[0], box.bottom - 1.6],
    },
  ];
}

/** Lengths of bars in m, and the longest that a bar may be on paper in mm. */
const LENGTHS = [5000, 2000, 1000, 500, 200, 100, 50, 20, 10, 5, 2, 1];
const LONGEST = 90;

/**
 * How long the scale bar is on the ground and on paper.
 *
 * Units: metres m, long mm. Valid: denominator > 0. Source: [own].
 */
export function scaleBar(denominator: number): { readonly metres: number; readonly long: number } {
  const metres = LENGTHS.find((one) => (one * 1000) / denominator <= LONGEST) ?? 1;
  return { metres, long: (metres * 1000) / denominator };
}

/**
 * Where the scale bar stands: at the bottom left of the window.
 *
 * Units: mm. Valid: any frame. Source: [own].
 */
export function scaleBarBox({ window, denominator }: GroundFrame): Rectangle {
  const { long } = scaleBar(denominator);
  const [left, bottom] = [window.left + ASIDE, window.bottom - ASIDE];
  return { left, top: bottom - 13, right: left + long + 16, bottom };
}

/** Where the bar is cut and which figures stand over it, as shares of its length. */
const CUTS = [0, 0.1, 0.2, 0.3, 0.4, 0.5, 1];
const FIGURES = [0, 0.1, 0.5, 1];

/**
 * The scale bar with the scale. It says on which paper the scale holds: a copy that was made smaller still
 * has a true bar.
 *
 * Units: mm. Valid: any frame. Source: [own].
 */
export function scaleBarMarks(frame: GroundFrame, paper: string): Mark[] {
  const { metres, long } = scaleBar(frame.denominator);
  const box = scaleBarBox(frame);
  const [left, top] = [box.left + 4, box.top + 5.2];
  const cells = CUTS.slice(1).map((to, k): Mark => {
    const from = CUTS[k] ?? 0;
    const cell = { left: left + from * long, right: left + to * long, top, bottom: top + 1.6 };
    return boxMark(cell, { fill: k % 2 === 0 ? 'ink' : 'paper', stroke: THIN });
  });
  const figures = FIGURES.map((share): Mark => ({
    ...{ kind: 'words', size: 7, anchor: 'middle' },
    words: `${formatCount(share * metres)}${share === 1 ? ' m' : ''}`,
    at: [left + share * long, top - 1],
  }));
  const words = `Scale 1 : ${formatCount(frame.denominator)} on ${paper}`;
  return [
    boxMark(box, BACKED),
    ...cells,
    ...figures,
    { kind: 'words', words, size: 7, at: [left, box.bottom - 1.7] },
  ];
}

/**
 * The neat line round a map and the frame round a sheet.
 *
 * Units: mm. Valid: any rectangle. Source: [own].
 */
export function frameMarks(frame: Rectangle, window: Rectangle, column: Rectangle): Mark[] {
  return [
    boxMark(window, { stroke: { ink: 'ink', width: 0.35 } }),
    lineMark([[column.left, column.top], [column.left, column.bottom]], { ink: 'ink', width: 0.35 }), // prettier-ignore
    boxMark(frame, { stroke: { ink: 'ink', width: 0.7 } }),
  ];
}
