import { expect } from 'vitest';
import type { WallResult } from '../../shared/assessment/assess-wall.ts';
import { assessWall } from '../../shared/assessment/assess-wall.ts';
import type { AssessmentRules } from '../../shared/assessment/rules.ts';
import type { Wall } from '../../shared/building/wall.ts';
import type { Drive } from '../../shared/ground/drive.ts';
import { groundModel } from '../../shared/ground/ground-model.ts';
import { oracleResult, type OracleResult } from './oracle-wall.ts';
import { sinksOfDrive } from './sinks-of-drive.ts';

/** Drives with their faces, and the rules: all but the wall. */
export type Scheme = {
  readonly drives: readonly Drive[];
  readonly faces?: readonly (number | undefined)[];
  readonly rules: AssessmentRules;
};

/** A wall by the product and by the oracle. */
export type Pair = { readonly got: WallResult; readonly wanted: OracleResult };

/** Assesses a wall both ways; the oracle samples it every `step` metres. */
export function bothWays({ drives, faces = [], rules }: Scheme, wall: Wall, step?: number): Pair {
  const { kind } = rules.depth;
  if (kind === 'layered') throw new Error('Layers are checked by point-sink-quadrature.test.ts.');
  const { cutOff, horizontalStrain, compression, focus } = rules;
  const got = assessWall(groundModel(drives, rules), wall, rules, faces);
  const wanted = oracleResult(
    drives.map((drive, k) => sinksOfDrive(drive, { face: faces[k] })),
    { rule: kind, focus, levels: { ground: wall.groundLevel, founding: wall.foundingLevel } },
    {
      start: wall.segment.start,
      end: wall.segment.end,
      height: wall.height,
      eOverG: wall.eOverG.central,
      poisson: wall.poisson,
    },
    {
      cutOff:
        cutOff.kind === 'settlement'
          ? { settlement: cutOff.settlement }
          : { widths: cutOff.widths },
      horizontalStrain,
      compression,
    },
    step,
  );
  return { got, wanted };
}

/** How far apart the two are: ends and settlement m, strain as a share of the oracle's, slope m/m. */
export type Gaps = {
  readonly ends: number;
  readonly settlement: number;
  readonly slope: number;
  readonly strain: number;
};

function modesOf({ got, wanted }: Pair): [string, string] {
  return [
    got.zones.map(({ mode }) => mode).join(' '),
    wanted.zones.map(({ hogging }) => (hogging ? 'hogging' : 'sagging')).join(' '),
  ];
}

/** The gaps of a pair; the zones must be the same in number and mode. */
export function gapsOf(pair: Pair, name = 'zones'): Gaps {
  const { got, wanted } = pair;
  const [modes, wantedModes] = modesOf(pair);
  expect(modes, name).toBe(wantedModes);
  let [ends, strain] = [0, 0];
  for (const [k, zone] of wanted.zones.entries()) {
    const other = got.zones[k];
    if (other === undefined) continue;
    ends = Math.max(ends, Math.abs(other.start - zone.start), Math.abs(other.end - zone.end));
    strain = Math.max(strain, Math.abs(other.strain / zone.strain - 1));
  }
  return {
    ends,
    strain,
    settlement: Math.abs(got.settlementMax - wanted.settlementMax),
    slope: Math.abs(got.slopeMax - wanted.slopeMax),
  };
}
