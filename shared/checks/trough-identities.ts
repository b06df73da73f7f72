import { FIELD, type FieldQuantity } from '../ground/kernel.ts';
import { volumePerMetre } from '../ground/volume-loss.ts';
import { at } from '../numerics/at.ts';
import { checkRow, type Check } from './check.ts';
import data from './data/trough-identities.json' with { type: 'json' };
import { HALF_LENGTH, straightDrive, surfaceMovement } from './straight-drive.ts';

const CASE = { diameter: 6, axisDepth: 20, troughWidth: 0.5, volumeLoss: 0.01 };
const WIDTH = CASE.troughWidth * CASE.axisDepth;
const LAST_DIGIT = 0.00005;

/** The trapezium rule, exact to all digits for a smooth trough that dies out. */
function troughVolume(settlementAt: (y: number) => number): number {
  const step = WIDTH / 8;
  let sum = 0;
  for (let k = -80; k <= 80; k++) sum += settlementAt(k * step);
  return sum * step;
}

/**
 * What a Gaussian trough must obey whatever its size: volume, slope, curvature, reach, and the state
 * above an open face.
 *
 * Units: ratios. Valid: exact identities, compared to four digits. Source: attewell-woodman-1982.
 */
export const troughIdentities: Check = {
  id: 'trough-identities',
  name: 'Identities of the trough and of the advancing face',
  source: 'attewell-woodman-1982',
  provenance: `${data.where}: ${data.provenance}`,
  run: () => {
    const model = straightDrive(CASE);
    const get = (name: FieldQuantity, y: number) => at(surfaceMovement(model, [0, y]), FIELD[name]);
    const atFace = (name: FieldQuantity) =>
      at(surfaceMovement(model, [0, 0], HALF_LENGTH), FIELD[name]);
    const largest = get('settlement', 0);
    const slope = (Math.abs(get('slopeNorth', WIDTH)) * WIDTH) / largest;
    const curvature = (get('curvatureNorthNorth', Math.sqrt(3) * WIDTH) * WIDTH * WIDTH) / largest;
    const reach = get('settlement', 2.5 * WIDTH) / largest;
    const volume = troughVolume((y) => get('settlement', y));
    const expected = volumePerMetre(CASE.volumeLoss, CASE.diameter);
    const along = (Math.abs(atFace('slopeEast')) * WIDTH) / largest;
    return [
      checkRow('volume of the trough, of the volume lost', '', 1, volume / expected, 1e-9),
      checkRow('volume lost per metre, 1 % of 28.2743 m²', 'm³/m', 0.282743, expected, 5e-7),
      checkRow('steepest slope, of S/i', '', data.steepestSlope, slope, LAST_DIGIT),
      checkRow(
        'largest hogging curvature, of S/i²',
        '',
        data.largestHoggingCurvature,
        curvature,
        LAST_DIGIT,
      ),
      checkRow(
        'settlement at 2.5 i, of the largest',
        '',
        data.settlementAtReach,
        reach,
        LAST_DIGIT,
      ),
      checkRow(
        'settlement above an open face, of the final',
        '',
        data.shareAboveOpenFace,
        atFace('settlement') / largest,
        1e-9,
      ),
      checkRow(
        'steepest slope along the drive, of S/i',
        '',
        data.steepestSlopeAlong,
        along,
        LAST_DIGIT,
      ),
    ];
  },
};
