import { FIELD } from '../ground/kernel.ts';
import { at } from '../numerics/at.ts';
import { millimetresFromMetres } from '../units/millimetres-from-metres.ts';
import { troughWidth } from '../ground/trough-width.ts';
import { checkRow, type Check, type CheckRow } from './check.ts';
import data from './data/bitetti-troughs.json' with { type: 'json' };
import { straightDrive, surfaceMovement } from './straight-drive.ts';

const ROUNDED_WIDTH = 0.005;

/**
 * Seven troughs over one tunnel at falling cover: width, largest settlement and largest horizontal
 * movement.
 *
 * Units: m and mm. Valid: within 0.5 %, since the table rounds i; one figure within 1 %, see its provenance. Source: bitetti-2010.
 */
export const bitettiTroughs: Check = {
  id: 'bitetti-troughs',
  name: 'Width, settlement and horizontal movement of seven troughs',
  source: 'bitetti-2010',
  provenance: `${data.where}: ${data.provenance}`,
  run: () =>
    data.rows.flatMap(({ cover, width, settlement, movement, movementTolerance }): CheckRow[] => {
      const { diameter, troughWidth: K, volumeLoss } = data;
      const axisDepth = cover + diameter / 2;
      const levels = { ground: 0, founding: 0, axis: -axisDepth };
      const i = troughWidth({ kind: 'clay' }, K, levels);
      const model = straightDrive({ diameter, axisDepth, troughWidth: K, volumeLoss });
      const S = at(surfaceMovement(model, [0, 0]), FIELD.settlement);
      const u = Math.abs(at(surfaceMovement(model, [0, i]), FIELD.displacementNorth));
      const name = `cover ${cover} m`;
      return [
        checkRow(`${name}, trough width`, 'm', width, i, 0.05),
        checkRow(
          `${name}, largest settlement`,
          'mm',
          settlement,
          millimetresFromMetres(S),
          settlement * ROUNDED_WIDTH,
        ),
        checkRow(
          `${name}, largest horizontal movement`,
          'mm',
          movement,
          millimetresFromMetres(u),
          movement * (movementTolerance ?? ROUNDED_WIDTH),
        ),
      ];
    }),
};
