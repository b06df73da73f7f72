import { ROW_LOOKS, type RowLook } from './row-looks.ts';

type Hatch = NonNullable<RowLook['hatch']>;

/** Pixels of one tile, as many as fit the stroke's pitch twice on screens of double density. */
const SIZE = 16;
export const PIXEL_RATIO = 2;
const STROKE = 2;

/** A square of pixels, four bytes each, as the map takes it. */
export type HatchImage = {
  readonly width: number;
  readonly height: number;
  readonly data: Uint8ClampedArray;
};

/** What a hatch is called among the images of the map. */
export function hatchName(hatch: Hatch, colour: string): string {
  return `hatch-${hatch}-${colour}`;
}

/** Red, green and blue of a colour as `#16212e`. */
export function channels(colour: string): [number, number, number] {
  const value = Number.parseInt(colour.slice(1), 16);
  return [(value >> 16) & 255, (value >> 8) & 255, value & 255];
}

function isInked(hatch: Hatch, x: number, y: number): boolean {
  const up = (x + y) % SIZE < STROKE;
  const down = (x - y + SIZE) % SIZE < STROKE;
  return hatch === 'strokes' ? up : up || down;
}

/** A tile of strokes in one colour, clear between them. */
export function hatchImage(hatch: Hatch, colour: string): HatchImage {
  const data = new Uint8ClampedArray(SIZE * SIZE * 4);
  const ink = channels(colour);
  for (let y = 0; y < SIZE; y += 1) {
    for (let x = 0; x < SIZE; x += 1) {
      if (isInked(hatch, x, y)) data.set([...ink, 255], (y * SIZE + x) * 4);
    }
  }
  return { width: SIZE, height: SIZE, data };
}

export type ImageTaker = {
  addImage(name: string, image: HatchImage, options: { pixelRatio: number }): unknown;
};

/** Gives the map the hatches that its layers draw with. */
export function addHatches(map: ImageTaker): void {
  const looks: readonly RowLook[] = Object.values(ROW_LOOKS);
  for (const { hatch, edge } of looks) {
    if (hatch === undefined) continue;
    map.addImage(hatchName(hatch, edge), hatchImage(hatch, edge), { pixelRatio: PIXEL_RATIO });
  }
}
