import type { Drive } from '../../shared/ground/drive.ts';
import type { GroundRules } from '../../shared/ground/ground-model.ts';
import type { FivePosition, Range } from '../../shared/numerics/range.ts';
import { aModel } from './builders.ts';
import { deviations, kernelMovements, sinkMovements } from './field-against-sinks.ts';
import type { SinkPath } from './sink-path.ts';
import type { SinkLevels, SinkRule } from './sink-width.ts';
import { sinksOfDrive } from './sinks-of-drive.ts';

/** Drives and points at which the kernel is held against the quadrature; the rest has defaults. */
export type QuadratureCase = {
  readonly drives: readonly Drive[];
  readonly points: Float64Array;
  readonly depth?: GroundRules['depth'];
  readonly focus?: GroundRules['focus'];
  readonly levels?: SinkLevels;
  readonly faces?: readonly (number | undefined)[];
  /** Both of K and V_L. */
  readonly end?: keyof Range;
  /** The curve along which the sinks stand, where not along the drive's own axis. */
  readonly path?: SinkPath;
};

const POSITIONS: Record<keyof Range, FivePosition> = { low: 0, central: 2, high: 4 };

function sinkRule(depth: GroundRules['depth'], end: keyof Range): SinkRule {
  if (depth.kind !== 'layered') return depth.kind;
  const layers = depth.layers.map(({ baseLevel, troughWidth }) => ({
    base: baseLevel,
    K: troughWidth[end],
  }));
  return { layers };
}

/** How far the kernel is from the quadrature. */
export function kernelAgainstSinks({
  drives,
  points,
  depth = { kind: 'clay' },
  focus = 'axis',
  levels = { ground: 0, founding: 0 },
  faces = [],
  end = 'central',
  path,
}: QuadratureCase): ReturnType<typeof deviations> {
  const state = { position: POSITIONS[end], faces };
  const got = kernelMovements(aModel(drives, { depth, focus }), levels, state, points, {
    V_L: end,
  });
  const sinks = drives.map((drive, k) =>
    sinksOfDrive(drive, {
      face: faces[k],
      V_L: end,
      K: end,
      ...(path === undefined ? {} : { path }),
    }),
  );
  return deviations(
    got,
    sinkMovements(sinks, { rule: sinkRule(depth, end), focus, levels }, points),
  );
}
