import { integral, quadraturePoints } from './gauss-legendre.ts';
import type { SinkPath } from './sink-path.ts';
import { sinkFocus, sinkWidth, type SinkLevels, type SinkRule } from './sink-width.ts';

/**
 * A drive as a row of point sinks: what is lost per metre and K by chainage, and how far it is driven.
 * Nothing here or in what it imports comes from shared/.
 */
export type SinkDrive = {
  readonly path: SinkPath;
  readonly lossPerMetre: (s: number) => number;
  readonly K: (s: number) => number;
  readonly face: number | undefined;
  readonly share: number;
};

/** What the ground does at a point, in plan axes; u and strain towards the focus. */
export type Movement = {
  readonly S: number;
  readonly slope: readonly [east: number, north: number];
  readonly curvature: readonly [ee: number, en: number, nn: number];
  readonly u: readonly [east: number, north: number];
  readonly strain: readonly [ee: number, en: number, nn: number];
};

export type SinkGround = {
  readonly rule: SinkRule;
  readonly focus: 'axis' | 'deep';
  readonly levels: SinkLevels;
};

/** One sink: where it is, q = weight · V_s/(2π i²), w = 1/i² and i²/f. */
export type Sink = {
  readonly E: number;
  readonly N: number;
  readonly q: number;
  readonly w: number;
  readonly towardsFocus: number;
};

/** exp(−8²/2) is 1.3e-14. */
const REACH = 8;
/** Five points integrate a Gaussian over half its width to 2e-13 of its peak. */
const PANEL_IN_WIDTHS = 0.5;

function density(x: number): number {
  return Math.exp((-x * x) / 2) / Math.sqrt(2 * Math.PI);
}

/** Φ⁻¹ by halving on Φ, itself by quadrature of the density. */
export function deviate(share: number): number {
  let [low, high] = [-6, 6];
  for (let step = 0; step < 50; step++) {
    const middle = (low + high) / 2;
    if (0.5 + Math.sign(middle) * integral(density, 0, Math.abs(middle), 0.5) < share) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

function widthAt({ path, K }: SinkDrive, { rule, levels }: SinkGround, s: number): number {
  return sinkWidth(rule, K(s), levels, path.at(s).level);
}

/** The chainage up to which a drive acts. */
export function sinkEnd(drive: SinkDrive, ground: SinkGround): number {
  const { face, share, path } = drive;
  if (face === undefined || face >= path.length) return path.length;
  if (face <= 0) return 0;
  const shift = share === 0.5 ? 0 : widthAt(drive, ground, face) * deviate(share);
  return Math.min(path.length, Math.max(0, face + shift));
}

/** The sinks of drives as the quadrature needs them near a point, within `radius` of it. */
export function sinksOf(
  drives: readonly SinkDrive[],
  ground: SinkGround,
  centre: readonly [E: number, N: number],
  radius: number,
): Sink[] {
  const { focus, levels } = ground;
  const sinks: Sink[] = [];
  for (const drive of drives) {
    const { path, lossPerMetre } = drive;
    const end = sinkEnd(drive, ground);
    const cuts = [...path.breaks.filter((s) => s < end), end].sort((a, b) => a - b);
    for (const [k, from] of cuts.entries()) {
      const to = cuts[k + 1];
      if (to === undefined || to <= from) continue;
      const panel =
        PANEL_IN_WIDTHS *
        Math.min(widthAt(drive, ground, from + 1e-9), widthAt(drive, ground, to - 1e-9));
      for (const { s, weight } of quadraturePoints(from, to, panel)) {
        const { E, N, level } = path.at(s);
        const i = widthAt(drive, ground, s);
        if (Math.hypot(E - centre[0], N - centre[1]) > radius + REACH * i) continue;
        const q = (weight * lossPerMetre(s)) / (2 * Math.PI * i * i);
        const towardsFocus = (i * i) / sinkFocus(focus, levels, level);
        sinks.push({ E, N, q, w: 1 / (i * i), towardsFocus });
      }
    }
  }
  return sinks;
}

/** Movement at a point: Σ q·exp(−r²/2i²) and its first and second derivatives, term by term. */
export function movementAt(sinks: readonly Sink[], E: number, N: number): Movement {
  let [S, mE, mN, kEE, kEN, kNN, uE, uN, eEE, eEN, eNN] = [0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0];
  for (const { E: sinkE, N: sinkN, q, w, towardsFocus } of sinks) {
    const [dE, dN] = [E - sinkE, N - sinkN];
    const g = q * Math.exp((-(dE * dE + dN * dN) * w) / 2);
    const gE = -dE * w * g;
    const gN = -dN * w * g;
    const gEE = (dE * dE * w - 1) * w * g;
    const gEN = dE * dN * w * w * g;
    const gNN = (dN * dN * w - 1) * w * g;
    S += g;
    mE += gE;
    mN += gN;
    kEE += gEE;
    kEN += gEN;
    kNN += gNN;
    uE += towardsFocus * gE;
    uN += towardsFocus * gN;
    eEE += towardsFocus * gEE;
    eEN += towardsFocus * gEN;
    eNN += towardsFocus * gNN;
  }
  return {
    S,
    slope: [mE, mN],
    curvature: [kEE, kEN, kNN],
    u: [uE, uN],
    strain: [eEE, eEN, eNN],
  };
}
