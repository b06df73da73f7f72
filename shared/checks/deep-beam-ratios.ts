import { deflectionPerStrain } from '../building/deep-beam.ts';
import type { Mode } from '../building/curvature-runs.ts';
import { findRoot } from '../numerics/find-root.ts';
import { checkRow, type Check, type CheckRow } from './check.ts';
import data from './data/deep-beam-ratios.json' with { type: 'json' };

const LAST_DIGIT = 0.00005;
const HEIGHT = 10;

function modeNamed(name: string): Mode {
  return name === 'sagging' ? 'sagging' : 'hogging';
}

function perStrain(mode: Mode, lengthByHeight: number, eOverG: number) {
  const beam = { length: lengthByHeight * HEIGHT, height: HEIGHT, eOverG, poisson: 0.3 };
  return deflectionPerStrain(mode, beam);
}

/** The L/H at which bending becomes as severe as shear. */
function takeover(mode: Mode, eOverG: number): number {
  return findRoot(
    (ratio) => {
      const { bending, diagonal } = perStrain(mode, ratio, eOverG);
      return bending - diagonal;
    },
    0.01,
    50,
    1e-12,
  );
}

/**
 * The deflection ratio per limiting strain at L/H = 1, and where bending takes over from shear.
 *
 * Units: ratios. Valid: to the last digit printed. Source: burland-wroth-1974.
 */
export const deepBeamRatios: Check = {
  id: 'deep-beam-ratios',
  name: 'Deep beam: deflection ratio per limiting strain',
  source: 'burland-wroth-1974',
  provenance: `${data.where}: ${data.provenance}`,
  run: () => [
    ...data.rows.flatMap((row): CheckRow[] => {
      const { bending, diagonal } = perStrain(modeNamed(row.mode), 1, row.eOverG);
      const name = `${row.mode}, E/G ${row.eOverG}`;
      return [
        checkRow(`${name}, bending`, '', row.bending, bending, LAST_DIGIT),
        checkRow(`${name}, diagonal`, '', row.diagonal, diagonal, LAST_DIGIT),
      ];
    }),
    ...data.takeover.map((row) =>
      checkRow(
        `${row.mode}, L/H at which bending takes over, of E/G`,
        '',
        row.shareOfEOverG,
        takeover(modeNamed(row.mode), 2.6) / 2.6,
        1e-9,
      ),
    ),
  ],
};
