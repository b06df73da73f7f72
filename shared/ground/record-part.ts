import { at } from '../numerics/at.ts';
import { atPosition, type FivePosition } from '../numerics/range.ts';
import type { PlanPoint } from '../geometry/point.ts';
import type { Recorder } from '../working.ts';
import type { GroundModel } from './ground-model.ts';
import { FIELD, FIELD_SIZE, sumPieces } from './kernel.ts';
import type { PackedPart } from './nearest-part.ts';
import type { Place } from './place.ts';
import { recordTroughWidth } from './record-trough-width.ts';
import { ruleAt } from './trough-width-rule.ts';
import { depthToFocus, DEEP_FOCUS_SHARE } from './vector-focus.ts';
import { volumePerMetre } from './volume-loss.ts';

/**
 * A point on a wall with the direction in which the wall runs.
 *
 * Units: m; direction of length 1. Valid: any. Source: [own].
 */
export type PointOnWall = { readonly point: PlanPoint; readonly direction: PlanPoint };

function recordInputs(
  model: GroundModel,
  part: PackedPart,
  place: Place,
  position: FivePosition,
  record: Recorder,
): { V_s: number; i: number; f: number } {
  const { piece, axis } = part;
  const levels = { ground: place.groundLevel, founding: place.foundingLevel, axis };
  const V_L = piece.volumeLoss.central;
  const F = model.drives[piece.drive]?.laterFactor ?? 1;
  const V_s = F * volumePerMetre(V_L, piece.diameter);
  record({
    symbol: 'V_s',
    meaning: 'volume of the trough per metre of drive',
    expression: F === 1 ? 'V_L * pi * D^2 / 4' : 'F * V_L * pi * D^2 / 4',
    inputs: F === 1 ? { V_L, D: piece.diameter } : { F, V_L, D: piece.diameter },
    value: V_s,
    unit: 'm³/m',
    reference: 'attewell-woodman-1982',
  });
  const k = atPosition(piece.troughWidth, position);
  recordTroughWidth(ruleAt(model.rules.depth, position), k, levels, record);
  const { focus } = model.rules;
  const f = depthToFocus(focus, levels);
  const { ground, founding } = levels;
  record({
    symbol: 'f',
    meaning: `height of the founding level above the vector focus, "${focus}"`,
    expression:
      focus === 'axis' ? 'founding - axis' : '(ground - axis) * (1 + c) - (ground - founding)',
    inputs: focus === 'axis' ? { founding, axis } : { ground, founding, axis, c: DEEP_FOCUS_SHARE },
    value: f,
    unit: 'm',
    reference: focus === 'axis' ? 'oreilly-new-1982' : 'taylor-1995',
  });
  return { V_s, i: 1 / at(part.numbers, 4), f };
}

function recordPosition(
  part: PackedPart,
  [E, N]: PlanPoint,
  i: number,
  record: Recorder,
): { A: number; B: number; y: number } {
  const [E0, N0, c_E, c_N] = part.numbers;
  if (E0 === undefined || N0 === undefined || c_E === undefined || c_N === undefined) {
    return { A: 0, B: 0, y: 0 };
  }
  const L = at(part.numbers, 5) * i;
  const s = (E - E0) * c_E + (N - N0) * c_N;
  const y = (N - N0) * c_E - (E - E0) * c_N;
  record({
    symbol: 's',
    meaning: 'distance of the point along the part of drive, from its start',
    expression: '(E - E0) * c_E + (N - N0) * c_N',
    inputs: { E, E0, c_E, N, N0, c_N },
    value: s,
    unit: 'm',
    reference: 'own',
  });
  record({
    symbol: 'y',
    meaning: 'distance of the point across the drive, positive to its left',
    expression: '(N - N0) * c_E - (E - E0) * c_N',
    inputs: { E, E0, c_E, N, N0, c_N },
    value: y,
    unit: 'm',
    reference: 'own',
  });
  const [A, B] = [s / i, (s - L) / i];
  record({
    symbol: 'A',
    meaning: 'distance from the start of the part in trough widths',
    expression: 's / i',
    inputs: { s, i },
    value: A,
    unit: '',
    reference: 'attewell-woodman-1982',
  });
  record({
    symbol: 'B',
    meaning: `distance from the end of the part in trough widths; the part is ${L.toFixed(2)} m long`,
    expression: '(s - L) / i',
    inputs: { s, L, i },
    value: B,
    unit: '',
    reference: 'attewell-woodman-1982',
  });
  return { A, B, y };
}

/**
 * The working of one part of a drive at a point of a wall: trough volume and width, position, and the
 * settlement and movement along the wall that the kernel gives for this part alone.
 *
 * Units: m. Valid: central volume loss; `part` packed at the same place and position.
 * Source: attewell-woodman-1982.
 */
export function recordPart(
  model: GroundModel,
  part: PackedPart,
  place: Place,
  { point, direction }: PointOnWall,
  position: FivePosition,
  record: Recorder,
): { settlement: number; displacement: number } {
  const { V_s, i, f } = recordInputs(model, part, place, position, record);
  const { A, B, y } = recordPosition(part, point, i, record);
  const factor = model.groups[part.group]?.factors.central ?? 0;
  const one = new Float64Array(FIELD_SIZE);
  sumPieces(part.numbers, 1, ...point, one);
  const settlement = factor * at(one, FIELD.settlement);
  const [tx, ty] = direction;
  const slope = factor * (at(one, FIELD.slopeEast) * tx + at(one, FIELD.slopeNorth) * ty);
  const displacement =
    factor * (at(one, FIELD.displacementEast) * tx + at(one, FIELD.displacementNorth) * ty);
  record({
    symbol: 'S_part',
    meaning: 'settlement from this part of the drive',
    expression:
      'V_s / (sqrt(2 * pi) * i) * exp(-y^2 / (2 * i^2)) * (erf(A / sqrt(2)) - erf(B / sqrt(2))) / 2',
    inputs: { V_s, i, y, A, B },
    value: settlement,
    unit: 'm',
    reference: 'attewell-woodman-1982',
  });
  const [c_E, c_N] = [at(part.numbers, 2), at(part.numbers, 3)];
  const [t_s, t_y] = [tx * c_E + ty * c_N, ty * c_E - tx * c_N];
  record({
    symbol: 'm_part',
    meaning:
      'slope along the wall from this part; t_s and t_y are the wall along and across the drive',
    expression:
      't_s * V_s / (2 * pi * i^2) * exp(-y^2 / (2 * i^2)) * (exp(-A^2 / 2) - exp(-B^2 / 2)) - t_y * y / i^2 * S_part',
    inputs: { t_s, t_y, V_s, i, y, A, B, S_part: settlement },
    value: slope,
    unit: 'm/m',
    reference: 'attewell-woodman-1982',
  });
  record({
    symbol: 'u_part',
    meaning: 'horizontal movement along the wall from this part, towards the focus',
    expression: 'i^2 / f * m_part',
    inputs: { i, f, m_part: slope },
    value: displacement,
    unit: 'm',
    reference: model.rules.focus === 'axis' ? 'oreilly-new-1982' : 'taylor-1995',
  });
  return { settlement, displacement };
}
