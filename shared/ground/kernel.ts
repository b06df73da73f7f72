import { at } from '../numerics/at.ts';
import {
  NODES_PER_UNIT,
  NODE_STEP,
  NORMAL_TABLE,
  NORMAL_TABLE_STRIDE,
  TABLE_REACH,
} from '../numerics/normal-table.ts';

/**
 * Numbers per piece in a pack: easting and northing of its start, its direction east and north, 1/i,
 * length/i, V_s/i and i²/f.
 *
 * Units: m, none, 1/m, none, m³/m², m. Valid: a constant. Source: [own].
 */
export const PACK_STRIDE = 8;

/**
 * Where each quantity stands in the kernel's answer: settlement, its gradient and second derivatives,
 * horizontal displacement and strain tensor, in plan axes.
 *
 * Units: m, m/m, 1/m, m, m/m. Valid: read only. Source: [own].
 */
export const FIELD = {
  settlement: 0,
  slopeEast: 1,
  slopeNorth: 2,
  curvatureEastEast: 3,
  curvatureEastNorth: 4,
  curvatureNorthNorth: 5,
  displacementEast: 6,
  displacementNorth: 7,
  strainEastEast: 8,
  strainEastNorth: 9,
  strainNorthNorth: 10,
} as const;

/**
 * The name of a quantity in the kernel's answer.
 *
 * Units: see FIELD. Valid: a key of FIELD. Source: [own].
 */
export type FieldQuantity = keyof typeof FIELD;

/**
 * How many numbers the kernel answers with.
 *
 * Units: none. Valid: a constant. Source: [own].
 */
export const FIELD_SIZE = 11;

/** Across a piece, φ under 3e-15 of its peak adds less than rounding does. */
const REACH_ACROSS = 8.2;

/** Division is slow in the innermost loop. */
const THIRD = 1 / 3;

/** The node nearest an argument x ≥ −TABLE_REACH, rounding by truncation. */
const NEAREST_NODE = TABLE_REACH * NODES_PER_UNIT + 0.5;

/**
 * The one kernel: settlement, gradient and second derivatives at a point, and from them horizontal
 * displacement and strain towards the focus, summed over packed pieces of drive. Along a piece the
 * trough grows as Φ(A) − Φ(B), across it falls as φ(y/i); Φ and φ come from one table by a Taylor
 * series round the nearest node, written out three times because a call would cost a third of the
 * time.
 *
 * Units: see PACK_STRIDE and FIELD. Valid: any point; table error under 1e-11 of the largest value.
 * Source: attewell-woodman-1982 on a straight drive; the chain of pieces is [own].
 */
export function sumPieces(
  pack: Float64Array,
  count: number,
  easting: number,
  northing: number,
  into: Float64Array,
): void {
  const table = NORMAL_TABLE;
  let s = 0;
  let sx = 0;
  let sy = 0;
  let sxx = 0;
  let sxy = 0;
  let syy = 0;
  let ux = 0;
  let uy = 0;
  let exx = 0;
  let exy = 0;
  let eyy = 0;
  for (let o = 0; o < count * PACK_STRIDE; o += PACK_STRIDE) {
    const dx = easting - at(pack, o);
    const dy = northing - at(pack, o + 1);
    const cx = at(pack, o + 2);
    const cy = at(pack, o + 3);
    const inverse = at(pack, o + 4);
    const y = (dy * cx - dx * cy) * inverse;
    if (y > REACH_ACROSS || y < -REACH_ACROSS) continue;
    const a = (dx * cx + dy * cy) * inverse;
    if (a <= -TABLE_REACH) continue;
    const b = a - at(pack, o + 5);
    if (b >= TABLE_REACH) continue;

    let k = (y * NODES_PER_UNIT + NEAREST_NODE) | 0;
    let d = y - (k * NODE_STEP - TABLE_REACH);
    k *= NORMAL_TABLE_STRIDE;
    const across =
      at(pack, o + 6) *
      (at(table, k + 1) +
        d *
          (at(table, k + 2) +
            d * (at(table, k + 3) + d * (at(table, k + 4) + d * at(table, k + 5)))));

    let bigA = 1;
    let phiA = 0;
    let bigB = 0;
    let phiB = 0;
    if (a < TABLE_REACH) {
      k = (a * NODES_PER_UNIT + NEAREST_NODE) | 0;
      d = a - (k * NODE_STEP - TABLE_REACH);
      k *= NORMAL_TABLE_STRIDE;
      const t1 = at(table, k + 1);
      const t2 = at(table, k + 2);
      const t3 = at(table, k + 3);
      const t4 = at(table, k + 4);
      bigA = at(table, k) + d * (t1 + d * (t2 * 0.5 + d * (t3 * THIRD + d * (t4 * 0.25))));
      phiA = t1 + d * (t2 + d * (t3 + d * (t4 + d * at(table, k + 5))));
    }
    if (b > -TABLE_REACH) {
      k = (b * NODES_PER_UNIT + NEAREST_NODE) | 0;
      d = b - (k * NODE_STEP - TABLE_REACH);
      k *= NORMAL_TABLE_STRIDE;
      const t1 = at(table, k + 1);
      const t2 = at(table, k + 2);
      const t3 = at(table, k + 3);
      const t4 = at(table, k + 4);
      bigB = at(table, k) + d * (t1 + d * (t2 * 0.5 + d * (t3 * THIRD + d * (t4 * 0.25))));
      phiB = t1 + d * (t2 + d * (t3 + d * (t4 + d * at(table, k + 5))));
    }

    const settlement = across * (bigA - bigB);
    const slopeAlong = across * inverse * (phiA - phiB);
    const slopeAcross = -y * inverse * settlement;
    const alongAlong = across * inverse * inverse * (b * phiB - a * phiA);
    const alongAcross = -y * inverse * slopeAlong;
    const acrossAcross = (y * y - 1) * inverse * inverse * settlement;

    const slopeEast = slopeAlong * cx - slopeAcross * cy;
    const slopeNorth = slopeAlong * cy + slopeAcross * cx;
    const cxx = cx * cx;
    const cxy = cx * cy;
    const cyy = cy * cy;
    const eastEast = alongAlong * cxx - 2 * alongAcross * cxy + acrossAcross * cyy;
    const northNorth = alongAlong * cyy + 2 * alongAcross * cxy + acrossAcross * cxx;
    const eastNorth = (alongAlong - acrossAcross) * cxy + alongAcross * (cxx - cyy);
    const towardsFocus = at(pack, o + 7);

    s += settlement;
    sx += slopeEast;
    sy += slopeNorth;
    sxx += eastEast;
    sxy += eastNorth;
    syy += northNorth;
    ux += towardsFocus * slopeEast;
    uy += towardsFocus * slopeNorth;
    exx += towardsFocus * eastEast;
    exy += towardsFocus * eastNorth;
    eyy += towardsFocus * northNorth;
  }
  into[FIELD.settlement] = s;
  into[FIELD.slopeEast] = sx;
  into[FIELD.slopeNorth] = sy;
  into[FIELD.curvatureEastEast] = sxx;
  into[FIELD.curvatureEastNorth] = sxy;
  into[FIELD.curvatureNorthNorth] = syy;
  into[FIELD.displacementEast] = ux;
  into[FIELD.displacementNorth] = uy;
  into[FIELD.strainEastEast] = exx;
  into[FIELD.strainEastNorth] = exy;
  into[FIELD.strainNorthNorth] = eyy;
}
