import { modelOfCase, wallOfCase } from '../../shared/assessment/model-of-case.ts';
import { siteOfWall } from '../../shared/assessment/wall-field.ts';
import { FIELD_SIZE, sumPieces } from '../../shared/ground/kernel.ts';
import { levelField } from '../../shared/ground/level-field.ts';
import { CENTRAL } from '../../shared/numerics/range.ts';
import { medianTime } from './median-time.ts';
import { twinBoreCase } from './twin-bore-case.ts';

const WALLS = 500;
const POINTS = 40;

/** Nanoseconds per point and piece, over the pieces that walls beside the twin bore really sum. */
export function kernelTime(): number {
  const { walls, ...input } = twinBoreCase(WALLS, false);
  const { model, groundLevel } = modelOfCase(input);
  const sites = walls.flatMap((caseWall) => {
    const wall = wallOfCase(caseWall, groundLevel);
    const field = levelField(model, siteOfWall(model, wall), { position: CENTRAL, faces: [] });
    return field.packs.map((pack) => ({ ...pack, start: wall.segment.start }));
  });
  const pairs = sites.reduce((sum, { count }) => sum + count * POINTS, 0);
  const into = new Float64Array(FIELD_SIZE);
  const seconds = medianTime(9, () => {
    for (const { pack, count, start } of sites) {
      for (let k = 0; k < POINTS; k++) sumPieces(pack, count, start[0] + k / 3, start[1], into);
    }
  });
  return (seconds * 1e9) / pairs;
}
