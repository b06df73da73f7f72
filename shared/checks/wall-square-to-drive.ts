import { assessWall } from '../assessment/assess-wall.ts';
import { DEFAULT_RULES } from '../assessment/rules.ts';
import type { Mode } from '../building/curvature-runs.ts';
import { certain } from '../numerics/range.ts';
import { percentFromRatio } from '../units/percent-from-ratio.ts';
import { checkRow, type Check, type CheckRow } from './check.ts';
import data from './data/wall-square-to-drive.json' with { type: 'json' };
import { straightDrive } from './straight-drive.ts';

const LAST_DIGIT_M = 0.0005;
const LAST_DIGIT_PERCENT = 0.000005;

/**
 * One wall square to a drive through the whole method: zones, deflection ratio, horizontal strain and
 * strain of both.
 *
 * Units: m and %. Valid: 1 mm cut-off; to the last digit printed. Source: burland-1995.
 */
export const wallSquareToDrive: Check = {
  id: 'wall-square-to-drive',
  name: 'A wall square to a drive, from field to strain',
  source: 'burland-1995',
  provenance: `${data.where}: ${data.provenance}`,
  run: () => {
    const { from, to, height, eOverG, poisson } = data.wall;
    const wall = {
      name: 'wall',
      segment: { start: [0, from], end: [0, to] },
      groundLevel: 0,
      foundingLevel: 0,
      height,
      eOverG: certain(eOverG),
      poisson,
    } as const;
    const { zones } = assessWall(straightDrive(data), wall, DEFAULT_RULES, []);
    const rowsOf = (mode: Mode): CheckRow[] => {
      const expected = data[mode];
      const zone = zones.find((found) => found.mode === mode);
      const percent = (ratio: number | undefined) => percentFromRatio(ratio ?? NaN);
      return [
        checkRow('start', 'm', expected.start, (zone?.start ?? NaN) + from, LAST_DIGIT_M),
        checkRow('end', 'm', expected.end, (zone?.end ?? NaN) + from, LAST_DIGIT_M),
        checkRow(
          'deflection ratio',
          '%',
          expected.deflectionRatio,
          percent(zone?.deflectionRatio),
          LAST_DIGIT_PERCENT,
        ),
        checkRow(
          'horizontal strain',
          '%',
          expected.horizontalStrain,
          percent(zone?.horizontalStrain),
          LAST_DIGIT_PERCENT,
        ),
        checkRow('strain', '%', expected.strain, percent(zone?.strain), LAST_DIGIT_PERCENT),
      ].map((row) => ({ ...row, what: `${mode} zone, ${row.what}` }));
    };
    return [...rowsOf('sagging'), ...rowsOf('hogging')];
  },
};
