import type { Category } from '../../shared/damage/categories.ts';
import { DAMAGE, HATCH_TILE, type HatchStrokes } from '../../shared/presentation/damage-style.ts';

const STROKE = 'M-1 1 1-1M0 8 8 0M7 9 9 7';
const STROKES_AT_HALF_PITCH = 'M-1 1 1-1M-1 5 5-1M0 8 8 0M3 9 9 3M7 9 9 7';
const STROKE_THE_OTHER_WAY = 'M-1 7 1 9M0 0 8 8M7-1 9 1';
const STROKES_THE_OTHER_WAY = 'M-1 3 5 9M-1 7 1 9M0 0 8 8M3-1 9 5M7-1 9 1';

function strokesPath({ lean, pitch }: HatchStrokes): string {
  if (lean === 'rising') return pitch === HATCH_TILE ? STROKE : STROKES_AT_HALF_PITCH;
  return pitch === HATCH_TILE ? STROKE_THE_OTHER_WAY : STROKES_THE_OTHER_WAY;
}

/** The strokes of a category's tile; empty for category 0. */
export function hatchPath(category: Category): string {
  return (DAMAGE[category].hatch?.strokes ?? []).map(strokesPath).join('');
}

/** The tile of a category as an SVG picture of its own, `side` pixels wide. */
export function hatchTileSvg(category: Category, side: number = HATCH_TILE): string {
  const { fill, hatch } = DAMAGE[category];
  const strokes =
    hatch === null
      ? ''
      : `<path d="${hatchPath(category)}" fill="none" stroke="${hatch.colour}" stroke-width="${hatch.width}"/>`;
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
