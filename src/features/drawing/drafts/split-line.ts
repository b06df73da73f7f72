import type { GridPlace } from '../../map/place/grid-projection.ts';
import type { Ring } from './draft.ts';

/** How far a line is drawn on, in metres, so that an end set on a wall lies outside the building. */
const FURTHER = 0.25;

function drawnOn(end: GridPlace, before: GridPlace): GridPlace {
  const [dx, dy] = [end[0] - before[0], end[1] - before[1]];
  const length = Math.hypot(dx, dy);
  if (length === 0) return end;
  return [end[0] + (dx / length) * FURTHER, end[1] + (dy / length) * FURTHER];
}

/** The line that cuts, straight on at both ends. */
export function splitLine(line: Ring): Ring {
  const [first, second] = line;
  const [last, beforeLast] = [line.at(-1), line.at(-2)];
  if (!first || !second || !last || !beforeLast) return line;
  return [drawnOn(first, second), ...line.slice(1, -1), drawnOn(last, beforeLast)];
}
