import type { Recorder } from '../working.ts';
import type { Mode } from './curvature-runs.ts';

/**
 * A zone of a wall as a deep beam: length, height, E/G and Poisson's ratio.
 *
 * Units: m, none. Valid: length > 0, height > 0, eOverG > 0. Source: burland-wroth-1974.
 */
export type DeepBeam = {
  readonly length: number;
  readonly height: number;
  readonly eOverG: number;
  readonly poisson: number;
};

/**
 * The section of a deep beam per unit width: second moment of area I and distance t from the neutral
 * axis to the tension fibre. Sagging has the axis at mid-height, hogging at the base.
 *
 * Units: m → m⁴/m and m. Valid: height > 0. Source: burland-wroth-1974.
 */
export function beamSection(
  mode: Mode,
  height: number,
  record?: Recorder,
): { I: number; t: number } {
  const share = mode === 'sagging' ? 12 : 3;
  const I = (height * height * height) / share;
  const t = mode === 'sagging' ? height / 2 : height;
  record?.({
    symbol: 'I',
    meaning: `second moment of area per unit width, ${mode}`,
    expression: mode === 'sagging' ? 'H^3 / 12' : 'H^3 / 3',
    inputs: { H: height },
    value: I,
    unit: 'm³',
    reference: 'burland-wroth-1974',
  });
  record?.({
    symbol: 't',
    meaning: 'distance from the neutral axis to the tension fibre',
    expression: mode === 'sagging' ? 'H / 2' : 'H',
    inputs: { H: height },
    value: t,
    unit: 'm',
    reference: 'burland-wroth-1974',
  });
  return { I, t };
}

/**
 * (Δ/L)/ε_b and (Δ/L)/ε_d: the deflection ratio at which the extreme fibre strain of bending and of
 * diagonal shear is one.
 *
 * Units: none. Valid: as DeepBeam. Source: burland-wroth-1974, burland-1995.
 */
export function deflectionPerStrain(
  mode: Mode,
  { length: L, height: H, eOverG: EG }: DeepBeam,
  record?: Recorder,
): { bending: number; diagonal: number } {
  const { I, t } = beamSection(mode, H, record);
  const bending = L / (12 * t) + ((3 * I) / (2 * t * L * H)) * EG;
  const diagonal = 1 + (H * L * L) / (18 * I * EG);
  record?.({
    symbol: 'r_b',
    meaning: 'deflection ratio per unit of bending strain',
    expression: 'L / (12 * t) + 3 * I / (2 * t * L * H) * EG',
    inputs: { L, H, I, t, EG },
    value: bending,
    unit: '',
    reference: 'burland-1995',
  });
  record?.({
    symbol: 'r_d',
    meaning: 'deflection ratio per unit of diagonal strain',
    expression: '1 + H * L^2 / (18 * I) / EG',
    inputs: { L, H, I, EG },
    value: diagonal,
    unit: '',
    reference: 'burland-1995',
  });
  return { bending, diagonal };
}

/**
 * The tensile strains of a zone: bending and diagonal, each with the horizontal strain, and the
 * larger of the two.
 *
 * Units: m/m. Valid: finite. Source: burland-1995.
 */
export type BeamStrains = {
  readonly bendingStrain: number;
  readonly diagonalStrain: number;
  readonly strain: number;
  readonly governing: 'bending' | 'diagonal';
};

/**
 * The tensile strains of a deep beam bent to a deflection ratio and stretched by a horizontal strain,
 * which keeps its sign: compression is not tension.
 *
 * Units: m/m. Valid: deflectionRatio ≥ 0; as DeepBeam. Source: burland-1995.
 */
export function beamStrains(
  mode: Mode,
  beam: DeepBeam,
  deflectionRatio: number,
  horizontalStrain: number,
  record?: Recorder,
): BeamStrains {
  const per = deflectionPerStrain(mode, beam, record);
  const [bending, shear] = [deflectionRatio / per.bending, deflectionRatio / per.diagonal];
  const nu = beam.poisson;
  const bendingStrain = bending + horizontalStrain;
  const half = (horizontalStrain * (1 + nu)) / 2;
  const diagonalStrain = (horizontalStrain * (1 - nu)) / 2 + Math.sqrt(half * half + shear * shear);
  const governing = bendingStrain > diagonalStrain ? 'bending' : 'diagonal';
  const strain = Math.max(bendingStrain, diagonalStrain);
  record?.({
    symbol: 'ε_bt',
    meaning: 'bending strain with horizontal strain',
    expression: 'DL / r_b + ε_h',
    inputs: { DL: deflectionRatio, r_b: per.bending, ε_h: horizontalStrain },
    value: bendingStrain,
    unit: 'm/m',
    reference: 'burland-1995',
  });
  record?.({
    symbol: 'ε_dt',
    meaning: 'diagonal strain with horizontal strain',
    expression: 'ε_h * (1 - ν) / 2 + sqrt((ε_h * (1 + ν) / 2)^2 + (DL / r_d)^2)',
    inputs: { DL: deflectionRatio, r_d: per.diagonal, ε_h: horizontalStrain, ν: nu },
    value: diagonalStrain,
    unit: 'm/m',
    reference: 'burland-1995',
  });
  record?.({
    symbol: 'ε',
    meaning: `largest tensile strain of the zone, ${governing} governs`,
    expression: 'max(ε_bt, ε_dt)',
    inputs: { ε_bt: bendingStrain, ε_dt: diagonalStrain },
    value: strain,
    unit: 'm/m',
    reference: 'burland-1995',
  });
  return { bendingStrain, diagonalStrain, strain, governing };
}
