import type { RegisterRow } from '../../../shared/schemas/register.ts';
import type { CameraBounds } from '../map/camera.ts';

/** What shows all of some buildings; null where there are none. */
export function homeOfBuildings(rows: readonly Pick<RegisterRow, 'centre'>[]): CameraBounds | null {
  if (rows.length === 0) return null;
  const longitudes = rows.map(({ centre }) => centre[0]);
  const latitudes = rows.map(({ centre }) => centre[1]);
  return [
    Math.min(...longitudes),
    Math.min(...latitudes),
    Math.max(...longitudes),
    Math.max(...latitudes),
  ];
}
