/**
 * A place on paper from the top left corner of a sheet, y downwards.
 *
 * Units: mm. Valid: any. Source: [own].
 */
export type Spot = readonly [x: number, y: number];

/**
 * What a mark is drawn with, by name.
 *
 * Units: none. Valid: closed list. Source: [own].
 */
export type Ink =
  | 'ink'
  | 'second'
  | 'third'
  | 'hairline'
  | 'rule'
  | 'contour'
  | 'band'
  | 'buildingEdge'
  | 'paper'
  | 'street'
  | 'streetEdge'
  | 'park'
  | 'water'
  | 'waterEdge';

/**
 * A line: its ink, its width, and the lengths of dashes and gaps in turn.
 *
 * Units: mm. Valid: width > 0. Source: [own].
 */
export type Stroke = {
  readonly ink: Ink;
  readonly width: number;
  readonly dash?: readonly number[];
};

/**
 * What a building takes its colour and hatch from.
 *
 * Units: none. Valid: number is a category 0 to 4, a stage 2 or 3, or a place of CONTOUR_LEVELS.
 * Source: [own].
 */
export type Tone = { readonly by: 'category' | 'stage' | 'settlement'; readonly number: number };

/**
 * Something drawn on a sheet of paper. Sheets are lists of marks, in the order in which they are laid
 * down, so that paper and screen draw the same.
 *
 * Units: mm; size of words in points of print. Valid: `along` is a direction of length 1, to the right
 * where it is left out; words stand on their
 * place; rings of toned shapes are filled by the rule of even and odd. Source: [own].
 */
export type Mark =
  | {
      readonly kind: 'shape';
      readonly rings: readonly (readonly Spot[])[];
      readonly isClosed: boolean;
      readonly fill?: Ink;
      readonly stroke?: Stroke;
    }
  | {
      readonly kind: 'toned';
      readonly tone: Tone;
      readonly rings: readonly (readonly Spot[])[];
    }
  | {
      readonly kind: 'words';
      readonly words: string;
      readonly at: Spot;
      readonly size: number;
      readonly isStrong?: boolean;
      readonly ink?: Ink;
      readonly anchor?: 'start' | 'middle' | 'end';
      readonly along?: Spot;
    }
  | { readonly kind: 'within'; readonly window: Rectangle; readonly marks: readonly Mark[] };

/**
 * A rectangle with sides along the paper's.
 *
 * Units: mm. Valid: left ≤ right and top ≤ bottom. Source: [own].
 */
export type Rectangle = {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
};

/**
 * How wide words are on paper.
 *
 * Units: size in points of print, width mm. Valid: the fonts of whoever draws. Source: [own].
 */
export type Measure = (words: string, size: number, isStrong: boolean) => number;

/**
 * A line through places, not closed.
 *
 * Units: mm. Valid: at least two places. Source: [own].
 */
export function lineMark(places: readonly Spot[], stroke: Stroke): Mark {
  return { kind: 'shape', rings: [places], isClosed: false, stroke };
}

/**
 * The corners of a rectangle, clockwise from the top left.
 *
 * Units: mm. Valid: any rectangle. Source: [own].
 */
export function cornersOf({
  left,
  top,
  right,
  bottom,
}: Rectangle): readonly [Spot, Spot, Spot, Spot] {
  return [[left, top], [right, top], [right, bottom], [left, bottom]]; // prettier-ignore
}

/**
 * Whether a place lies in a rectangle or on its edge.
 *
 * Units: mm. Valid: any rectangle. Source: [own].
 */
export function isInside({ left, top, right, bottom }: Rectangle, [x, y]: Spot): boolean {
  return x >= left && x <= right && y >= top && y <= bottom;
}

/**
 * What two rectangles have in common.
 *
 * Units: mm. Valid: rectangles that meet; of others it is none. Source: [own].
 */
export function overlap(a: Rectangle, b: Rectangle): Rectangle {
  return {
    left: Math.max(a.left, b.left),
    top: Math.max(a.top, b.top),
    right: Math.min(a.right, b.right),
    bottom: Math.min(a.bottom, b.bottom),
  };
}

/**
 * A rectangle, filled or with its outline drawn.
 *
 * Units: mm. Valid: any rectangle. Source: [own].
 */
export function boxMark(
  box: Rectangle,
  look: { readonly fill?: Ink; readonly stroke?: Stroke },
): Mark {
  return { kind: 'shape', rings: [cornersOf(box)], isClosed: true, ...look };
}
