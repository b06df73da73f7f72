import { difference } from 'polyclip-ts';
import { partArea } from '../../../../shared/building/footprint-area.ts';
import type { GridPlace } from '../../map/place/grid-projection.ts';
import { partsOf, type Parts, type Ring } from './draft.ts';

/** Half as wide as the gap that shows where a line cuts, in metres: too narrow to be seen or measured. */
const HALF_GAP = 1e-5;
/** Slivers of the gap are no pieces. */
const LEAST_AREA = 0.01;

type Pair = [number, number];

/** A gap along one stretch of the line, with its corners from `origin`. */
function gapOf(from: GridPlace, to: GridPlace, origin: GridPlace): Pair[][] {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  const [east, north] = [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
  const [dx, dy] = [east * HALF_GAP, north * HALF_GAP];
  const [x0, y0] = [from[0] - origin[0] - dx, from[1] - origin[1] - dy];
  const [x1, y1] = [to[0] - origin[0] + dx, to[1] - origin[1] + dy];
  return [
    [
      [x0 - dy, y0 + dx],
      [x0 + dy, y0 - dx],
      [x1 + dy, y1 - dx],
      [x1 - dy, y1 + dx],
    ],
  ];
}

function moved(ring: Ring, [east, north]: GridPlace): Pair[] {
  return ring.map(([x, y]) => [x + east, y + north]);
}

function piecesOfPart(part: readonly Ring[], gaps: Pair[][][], origin: GridPlace): Parts {
  const local = part.map((ring) => moved(ring, [-origin[0], -origin[1]]));
  try {
    const pieces = difference([local], ...gaps.map((gap) => [gap]));
    return partsOf(pieces.map((piece) => piece.map((ring) => moved(ring, origin))));
  } catch {
    return [part];
  }
}

/**
 * The pieces that a line makes of a building, the largest first with whatever the line does not meet; empty
 * where it cuts nothing off. For looking at: the server cuts for good.
 */
export function splitPreview(parts: Parts, line: Ring): readonly Parts[] {
  const origin = parts[0]?.[0]?.[0];
  if (origin === undefined || line.length < 2) return [];
  const gaps = line.slice(1).flatMap((to, k) => {
    const from = line[k];
    const isStretch = from !== undefined && (from[0] !== to[0] || from[1] !== to[1]);
    return isStretch ? [gapOf(from, to, origin)] : [];
  });
  const cut = parts.map((part) =>
    piecesOfPart(part, gaps, origin).filter((piece) => partArea(piece) > LEAST_AREA),
  );
  const whole = parts.filter((_, k) => (cut[k]?.length ?? 0) < 2);
  const pieces = cut.filter((one) => one.length > 1).flat();
  const [largest, ...others] = pieces.toSorted((a, b) => partArea(b) - partArea(a));
  return largest === undefined ? [] : [[largest, ...whole], ...others.map((piece) => [piece])];
}
