// @vitest-environment node
import { describe, expect, it } from 'vitest';
import {
  pictureFrame,
  tilesInFrame,
} from '../../../../../src/features/schemes/picture/picture-frame.ts';

/** A town of about 1.7 by 1.4 km. */
const TOWN = [1.627, 54.748, 1.654, 54.761] as const;
const SIZE = { width: 356, height: 150 };
const ZOOMS = { minzoom: 13, maxzoom: 17, bounds: null };

describe('pictureFrame', () => {
  const frame = pictureFrame([...TOWN], SIZE);

  it('is filled across by what lies within the bounds', () => {
    const metres = SIZE.width / frame.pixelsPerMetre;
    expect(metres).toBeGreaterThan(1700);
    expect(metres).toBeLessThan(1760);
  });

  it('has the middle of the bounds in its middle', () => {
    const middle = (frame.left + SIZE.width / 2) / frame.world;
    expect(middle * 360 - 180).toBeCloseTo(1.6405, 6);
  });

  it('keeps a third of a town that is long from north to south', () => {
    const long = pictureFrame([1.64, 54.7, 1.641, 54.8], SIZE);
    expect(SIZE.height / long.pixelsPerMetre).toBeCloseTo(11_100 / 3, -2);
  });
});

describe('tilesInFrame', () => {
  it('covers the frame with tiles of about their own size', () => {
    const frame = pictureFrame([...TOWN], SIZE);
    const tiles = tilesInFrame(frame, ZOOMS);
    expect(tiles.map(({ z, x, y }) => `${z}/${x}/${y}`)).toEqual(['13/4133/2600']);
    expect(Math.min(...tiles.map(({ left }) => left))).toBeLessThanOrEqual(0);
    expect(Math.max(...tiles.map(({ left, side }) => left + side))).toBeGreaterThanOrEqual(356);
    expect(Math.max(...tiles.map(({ top, side }) => top + side))).toBeGreaterThanOrEqual(150);
    for (const { side } of tiles) {
      expect(side).toBeGreaterThan(512 / 1.5);
      expect(side).toBeLessThan(512 * 1.5);
    }
  });

  it('keeps to the zooms that there are', () => {
    const house = pictureFrame([1.64, 54.75, 1.6401, 54.7501], SIZE);
    expect(tilesInFrame(house, ZOOMS).map(({ z }) => z)).toContain(17);
  });

  it('asks for none outside of the bounds of the set', () => {
    const frame = pictureFrame([1.62, 54.7, 1.7, 54.8], SIZE);
    const all = tilesInFrame(frame, ZOOMS);
    const within = tilesInFrame(frame, { ...ZOOMS, bounds: [...TOWN] });
    expect(within.length).toBeLessThan(all.length);
    expect(within.map(({ x, y }) => `${x}/${y}`)).toContain('4133/2600');
  });

  it('is empty where it would take too many tiles', () => {
    const country = pictureFrame([-5, 50, 2, 58], SIZE);
    expect(tilesInFrame(country, ZOOMS)).toEqual([]);
  });
});
