import { oracleBeamStrains, type OracleBeam } from './oracle-beam.ts';
import { reachOf } from './oracle-reach.ts';
import { affectedPart, bentPieces, withoutSlivers, type Piece } from './oracle-zones.ts';
import { sinksOf, type SinkDrive, type SinkGround } from './point-sinks.ts';

/** A wall by plain numbers. */
export type OracleWall = OracleBeam & {
  readonly start: readonly [E: number, N: number];
  readonly end: readonly [E: number, N: number];
};

export type OracleRules = {
  /** Settlement in m that is ignored below, or trough widths beyond which all is. */
  readonly cutOff: { readonly settlement: number } | { readonly widths: number };
  readonly horizontalStrain: 'average' | 'peak';
  readonly compression: 'counted' | 'zero';
};

export type OracleZone = Piece & {
  readonly deflectionRatio: number;
  readonly horizontalStrain: number;
  readonly bending: number;
  readonly diagonal: number;
  readonly strain: number;
};

export type OracleResult = {
  readonly zones: readonly OracleZone[];
  readonly strain: number;
  readonly settlementMax: number;
  readonly slopeMax: number;
};

type Sample = { x: number; S: number; slope: number; curvature: number; u: number; strain: number };

/** exp(−25) is 1.4e-11 of a sink. */
const LEAST_EXPONENT = -25;

/**
 * The movement along a wall at a distance from its start. Along a straight line a sink is a Gaussian of
 * the distance from its foot on the line, so that one exponential gives all five.
 */
function alongWall(
  drives: readonly SinkDrive[],
  ground: SinkGround,
  { start, end }: OracleWall,
): { length: number; at: (x: number) => Sample } {
  const length = Math.hypot(end[0] - start[0], end[1] - start[1]);
  const [tE, tN] = [(end[0] - start[0]) / length, (end[1] - start[1]) / length];
  const feet = sinksOf(drives, ground, start, length).flatMap(({ E, N, q, w, towardsFocus }) => {
    const [dE, dN] = [E - start[0], N - start[1]];
    const off = dN * tE - dE * tN;
    const exponent = (-off * off * w) / 2;
    if (exponent < LEAST_EXPONENT) return [];
    return [dE * tE + dN * tN, q * Math.exp(exponent), w, towardsFocus];
  });
  const sinks = Float64Array.from(feet);
  function at(x: number): Sample {
    let [S, slope, curvature, u, strain] = [0, 0, 0, 0, 0];
    for (let o = 0; o < sinks.length; o += 4) {
      const d = x - (sinks[o] ?? 0);
      const w = sinks[o + 2] ?? 0;
      const exponent = (-d * d * w) / 2;
      if (exponent < LEAST_EXPONENT) continue;
      const one = (sinks[o + 1] ?? 0) * Math.exp(exponent);
      const first = -d * w * one;
      const second = (d * d * w - 1) * w * one;
      const towardsFocus = sinks[o + 3] ?? 0;
      S += one;
      slope += first;
      curvature += second;
      u += towardsFocus * first;
      strain += towardsFocus * second;
    }
    return { x, S, slope, curvature, u, strain };
  }
  return { length, at };
}

function zoneOf(
  piece: Piece,
  samples: readonly Sample[],
  at: (x: number) => Sample,
  wall: OracleWall,
  rules: OracleRules,
): OracleZone {
  const [a, b] = [at(piece.start), at(piece.end)];
  const length = b.x - a.x;
  const inside = [a, ...samples.filter(({ x }) => x > a.x && x < b.x), b];
  const deflection = Math.max(
    ...inside.map(({ x, S }) => Math.abs(S - a.S - ((b.S - a.S) * (x - a.x)) / length)),
  );
  const average = (b.u - a.u) / length;
  const peak = Math.max(...inside.map(({ strain }) => strain));
  const chosen = rules.horizontalStrain === 'average' ? average : peak;
  const horizontalStrain = rules.compression === 'zero' ? Math.max(0, chosen) : chosen;
  const deflectionRatio = deflection / length;
  const { bending, diagonal } = oracleBeamStrains(
    piece.hogging,
    length,
    wall,
    deflectionRatio,
    horizontalStrain,
  );
  const strain = Math.max(bending, diagonal);
  return { ...piece, deflectionRatio, horizontalStrain, bending, diagonal, strain };
}

/** Assesses a wall by sampling it every `step`: the method with nothing clever in it. */
export function oracleResult(
  drives: readonly SinkDrive[],
  ground: SinkGround,
  wall: OracleWall,
  rules: OracleRules,
  step = 0.005,
): OracleResult {
  const { length, at } = alongWall(drives, ground, wall);
  const steps = Math.ceil(length / step);
  const samples = Array.from({ length: steps + 1 }, (_, k) => at((k * length) / steps));
  const x = samples.map((sample) => sample.x);
  const { cutOff } = rules;
  let excess: number[];
  if ('settlement' in cutOff) {
    excess = samples.map(({ S }) => S - cutOff.settlement);
  } else {
    const reach = reachOf(drives, ground, cutOff.widths, wall.start, length);
    const [tE, tN] = [wall.end[0] - wall.start[0], wall.end[1] - wall.start[1]];
    excess = x.map((d) =>
      reach(wall.start[0] + (d / length) * tE, wall.start[1] + (d / length) * tN),
    );
  }
  const bent = bentPieces(
    x,
    samples.map(({ curvature }) => curvature),
  );
  const affected = bent.flatMap((piece) => affectedPart(piece, x, excess) ?? []);
  const zones = withoutSlivers(affected, (a, b) => at(b).slope - at(a).slope).map((piece) =>
    zoneOf(piece, samples, at, wall, rules),
  );
  return {
    zones,
    strain: Math.max(0, ...zones.map(({ strain }) => strain)),
    settlementMax: Math.max(...samples.map(({ S }) => S)),
    slopeMax: Math.max(...samples.map(({ slope }) => Math.abs(slope))),
  };
}
