import type { Category } from '../../shared/damage/categories.ts';

/** How one damage category is drawn, everywhere: table, chart, map and print. */
export type DamageStyle = {
  readonly fill: string;
  readonly edge: string;
  /** Of a number on the fill. */
  readonly text: string;
  /** Strokes over the fill; none for category 0. */
  readonly hatch: { readonly path: string; readonly colour: string; readonly width: number } | null;
};

/** The side of a hatch tile; the strokes of a tile run on in the next one on every side. */
export const HATCH_TILE = 8;

const STROKE = 'M-1 1 1-1M0 8 8 0M7 9 9 7';
const STROKES_AT_HALF_PITCH = 'M-1 1 1-1M-1 5 5-1M0 8 8 0M3 9 9 3M7 9 9 7';
const STROKE_THE_OTHER_WAY = 'M-1 7 1 9M0 0 8 8M7-1 9 1';

/**
 * One hue from straw to oxblood under a hatch that thickens by category, so that a copy in greys reads
 * alike. Category 4 stands for 4 to 5.
 */
export const DAMAGE: Readonly<Record<Category, DamageStyle>> = {
  0: { fill: '#F5EBCB', edge: '#948450', text: '#16212E', hatch: null },
  1: {
    fill: '#E9CC93',
    edge: '#8F6C2C',
    text: '#16212E',
    hatch: { path: STROKE, colour: '#8F6C2C', width: 0.8 },
  },
  2: {
    fill: '#D29A62',
    edge: '#7D4A1E',
    text: '#16212E',
    hatch: { path: STROKES_AT_HALF_PITCH, colour: '#6E3D16', width: 1.1 },
  },
  3: {
    fill: '#AE5638',
    edge: '#642416',
    text: '#FFFFFF',
    hatch: {
      path: `${STROKES_AT_HALF_PITCH}${STROKE_THE_OTHER_WAY}`,
      colour: '#4A120D',
      width: 1.1,
    },
  },
  4: {
    fill: '#541618',
    edge: '#360B0E',
    text: '#FFFFFF',
    hatch: { path: STROKE_THE_OTHER_WAY, colour: '#7A3A34', width: 0.6 },
  },
};

/** The tile of a category as an SVG picture of its own, `side` pixels wide. */
export function hatchTileSvg(category: Category, side: number = HATCH_TILE): string {
  const { fill, hatch } = DAMAGE[category];
  const strokes =
    hatch === null
      ? ''
      : `<path d="${hatch.path}" fill="none" stroke="${hatch.colour}" stroke-width="${hatch.width}"/>`;
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" width="${side}" height="${side}" ` +
    `viewBox="0 0 ${HATCH_TILE} ${HATCH_TILE}">` +
    `<rect width="${HATCH_TILE}" height="${HATCH_TILE}" fill="${fill}"/>${strokes}</svg>`
  );
}

/** The tile as an address for a CSS background or an image. */
export function hatchTileUrl(category: Category, side: number = HATCH_TILE): string {
  return `data:image/svg+xml,${encodeURIComponent(hatchTileSvg(category, side))}`;
}
