import type { Category } from '../damage/categories.ts';

/**
 * Strokes at an even pitch that rise or fall at 45° to the right. The pitch is measured along the side of
 * the tile.
 *
 * Units: pixels of the tile. Valid: the pitch divides HATCH_TILE. Source: [own].
 */
export type HatchStrokes = { readonly lean: 'rising' | 'falling'; readonly pitch: 4 | 8 };

/**
 * How one damage category is drawn, everywhere: table, chart, map and print. `text` is the colour of a
 * number on the fill; the hatch is strokes over the fill, none for category 0.
 *
 * Units: width of strokes in pixels of the tile. Valid: read only. Source: [own].
 */
export type DamageStyle = {
  readonly fill: string;
  readonly edge: string;
  readonly text: string;
  readonly hatch: {
    readonly strokes: readonly HatchStrokes[];
    readonly colour: string;
    readonly width: number;
  } | null;
};

/**
 * The side of a hatch tile; the strokes of a tile run on in the next one on every side.
 *
 * Units: pixels. Valid: a constant. Source: [own].
 */
export const HATCH_TILE = 8;

/**
 * One hue from straw to oxblood under a hatch that thickens by category, so that a copy in greys reads
 * alike. Category 4 stands for 4 to 5.
 *
 * Units: as DamageStyle. Valid: read only. Source: [own].
 */
export const DAMAGE: Readonly<Record<Category, DamageStyle>> = {
  0: { fill: '#F5EBCB', edge: '#948450', text: '#16212E', hatch: null },
  1: {
    fill: '#E9CC93',
    edge: '#8F6C2C',
    text: '#16212E',
    hatch: { strokes: [{ lean: 'rising', pitch: 8 }], colour: '#8F6C2C', width: 0.8 },
  },
  2: {
    fill: '#D29A62',
    edge: '#7D4A1E',
    text: '#16212E',
    hatch: { strokes: [{ lean: 'rising', pitch: 4 }], colour: '#6E3D16', width: 1.1 },
  },
  3: {
    fill: '#AE5638',
    edge: '#642416',
    text: '#FFFFFF',
    hatch: {
      strokes: [
        { lean: 'rising', pitch: 4 },
        { lean: 'falling', pitch: 8 },
      ],
      colour: '#4A120D',
      width: 1.1,
    },
  },
  4: {
    fill: '#541618',
    edge: '#360B0E',
    text: '#FFFFFF',
    hatch: { strokes: [{ lean: 'falling', pitch: 8 }], colour: '#7A3A34', width: 0.6 },
  },
};
