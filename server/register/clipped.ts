import type { Geom } from 'polyclip-ts';
import { AppError } from '../errors.ts';
import type { FootprintRings } from '../models/building-footprint.ts';

type Clip = (first: Geom, ...others: Geom[]) => [number, number][][][];

function geometry(footprint: FootprintRings): Geom {
  return footprint.map((part) =>
    part.map((ring) => ring.map(([x, y]): [number, number] => [x, y])),
  );
}

/** What comes of clipping footprints with each other; a refusal where they cannot be. */
export function clipped(
  clip: Clip,
  first: FootprintRings,
  ...others: FootprintRings[]
): FootprintRings {
  try {
    return clip(geometry(first), ...others.map(geometry));
  } catch {
    throw new AppError('invalid-input', 'These outlines cannot be worked with: draw them anew.');
  }
}
