import { FIELD } from '../ground/kernel.ts';
import { at } from '../numerics/at.ts';
import { millimetresFromMetres } from '../units/millimetres-from-metres.ts';
import { checkRow, type Check, type CheckRow } from './check.ts';
import data from './data/attewell-woodman-face.json' with { type: 'json' };
import { HALF_LENGTH, straightDrive, surfaceMovement } from './straight-drive.ts';

const MICRO = 1e6;
const LAST_DIGIT_MM = 0.00005;
const LAST_DIGIT_MICRO = 0.005;

/**
 * Movements and strains about a face at x = 0, driven from far behind towards +x.
 *
 * Units: mm and microstrain. Valid: to the last digit printed. Source: attewell-woodman-1982.
 */
export const attewellWoodmanFace: Check = {
  id: 'attewell-woodman-face',
  name: 'Movement and strain round an advancing face',
  source: 'attewell-woodman-1982',
  provenance: `${data.where}: ${data.provenance}`,
  run: () => {
    const model = straightDrive(data);
    return data.points.flatMap((point): CheckRow[] => {
      const [x = 0, y = 0] = point.at;
      const field = surfaceMovement(model, [x, y], HALF_LENGTH);
      const mm = (index: number) => millimetresFromMetres(at(field, index));
      const rows = [
        checkRow(
          'along the drive',
          'mm',
          point.alongDrive,
          mm(FIELD.displacementEast),
          LAST_DIGIT_MM,
        ),
        checkRow('settlement', 'mm', point.settlement, mm(FIELD.settlement), LAST_DIGIT_MM),
      ];
      if (point.across !== undefined) {
        const across = mm(FIELD.displacementNorth);
        rows.push(checkRow('across the drive', 'mm', point.across, across, LAST_DIGIT_MM));
      }
      if (point.strainAlong !== undefined) {
        const strain = at(field, FIELD.strainEastEast) * MICRO;
        rows.push(
          checkRow('strain along the drive', '10⁻⁶', point.strainAlong, strain, LAST_DIGIT_MICRO),
        );
      }
      if (point.shear !== undefined) {
        const shear = 2 * at(field, FIELD.strainEastNorth) * MICRO;
        rows.push(checkRow('shear strain', '10⁻⁶', point.shear, shear, LAST_DIGIT_MICRO));
      }
      return rows.map((row) => ({ ...row, what: `at (${x}, ${y}), ${row.what}` }));
    });
  },
};
