import { CATEGORIES, type Category } from '../../../../shared/damage/categories.ts';
import { DAMAGE, HATCH_TILE } from '../../../../shared/presentation/damage-style.ts';
import { hatchPath } from '../../../theme/damage.ts';
import { channels, PIXEL_RATIO, type HatchImage, type ImageTaker } from './hatch-images.ts';

/** Pixels of one tile: at double density five of the page, 0.62 of the size that charts draw it in. */
const SIZE = 10;
const PITCH = HATCH_TILE / SIZE;

type Stroke = readonly [x0: number, y0: number, x1: number, y1: number];

/** What the hatch of a category is called among the images of the map. */
export function damageName(category: Category): string {
  return `damage-${category}`;
}

/** The strokes of a path of nothing but straight ones, each of two points. */
function strokesOf(path: string): Stroke[] {
  const numbers = (path.match(/-?\d+/g) ?? []).map(Number);
  return Array.from({ length: numbers.length / 4 }, (_, k) => {
    const [x0 = 0, y0 = 0, x1 = 0, y1 = 0] = numbers.slice(4 * k, 4 * k + 4);
    return [x0, y0, x1, y1];
  });
}

/** How much of a pixel a stroke covers; strokes go on beyond the tile. */
function cover([x0, y0, x1, y1]: Stroke, width: number, x: number, y: number): number {
  const [dx, dy] = [x1 - x0, y1 - y0];
  const distance = Math.abs(dx * (y - y0) - dy * (x - x0)) / Math.hypot(dx, dy);
  return Math.min(1, Math.max(0, (width / 2 - distance) / PITCH + 0.5));
}

/** One tile of a category: its colour under its strokes. */
export function damageImage(category: Category): HatchImage {
  const { fill, hatch } = DAMAGE[category];
  const ground = channels(fill);
  const ink = channels(hatch?.colour ?? fill);
  const strokes = strokesOf(hatchPath(category));
  const data = new Uint8ClampedArray(SIZE * SIZE * 4);
  for (let row = 0; row < SIZE; row += 1) {
    for (let column = 0; column < SIZE; column += 1) {
      const [x, y] = [(column + 0.5) * PITCH, (row + 0.5) * PITCH];
      const share = Math.max(0, ...strokes.map((one) => cover(one, hatch?.width ?? 0, x, y)));
      const mixed = ground.map((value, k) => value + share * ((ink[k] ?? 0) - value));
      data.set([...mixed, 255], (row * SIZE + column) * 4);
    }
  }
  return { width: SIZE, height: SIZE, data };
}

/** Gives the map the tiles of the damage categories. */
export function addDamageImages(map: ImageTaker): void {
  for (const { category } of CATEGORIES) {
    map.addImage(damageName(category), damageImage(category), { pixelRatio: PIXEL_RATIO });
  }
}
