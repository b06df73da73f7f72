import type { PAPER_NAMES } from '../schemas/evidence.ts';
import type { Rectangle } from './marks.ts';

/**
 * The papers that sheets are made for, lying.
 *
 * Units: mm. Valid: read only. Source: iso-paper-2007.
 */
export const PAPERS = {
  A4: { width: 297, height: 210 },
  A3: { width: 420, height: 297 },
  A1: { width: 841, height: 594 },
  A0: { width: 1189, height: 841 },
} as const;

/**
 * A paper by its name.
 *
 * Units: none. Valid: of PAPERS. Source: iso-paper-2007.
 */
export type PaperName = (typeof PAPER_NAMES)[number];

/** How wide the column is, and how large its words are beside those of A3. */
const COLUMNS: Readonly<Record<PaperName, { readonly width: number; readonly scale: number }>> = {
  A4: { width: 76, scale: 0.85 },
  A3: { width: 96, scale: 1 },
  A1: { width: 124, scale: 1.2 },
  A0: { width: 150, scale: 1.4 },
};

/** From the edge of the paper to the frame, below it for a stamp, and from the frame to the neat line. */
const [EDGE, STAMP, NEAT] = [10, 14, 7];

/**
 * Where the parts of a sheet stand: the frame, the window of the map inside its neat line, the column at
 * the right, and the strip below the frame that stays free for a stamp. `scale` is that of the column's
 * words.
 *
 * Units: mm. Valid: made by `sheetLayout`. Source: [own].
 */
export type SheetLayout = {
  readonly paper: PaperName;
  readonly width: number;
  readonly height: number;
  readonly frame: Rectangle;
  readonly window: Rectangle;
  readonly column: Rectangle;
  readonly stamp: Rectangle;
  readonly scale: number;
};

/**
 * Where the parts of a sheet of a paper stand.
 *
 * Units: mm. Valid: any of PAPERS. Source: [own].
 */
export function sheetLayout(paper: PaperName): SheetLayout {
  const { width, height } = PAPERS[paper];
  const { width: wide, scale } = COLUMNS[paper];
  const frame = { left: EDGE, top: EDGE, right: width - EDGE, bottom: height - STAMP };
  const column = { ...frame, left: frame.right - wide };
  return {
    ...{ paper, width, height, frame, column, scale },
    window: {
      left: frame.left + NEAT,
      top: frame.top + NEAT,
      right: column.left - NEAT,
      bottom: frame.bottom - NEAT,
    },
    stamp: { left: frame.left, top: frame.bottom, right: frame.right, bottom: height - EDGE / 2 },
  };
}
