import type { BuildingWall } from '../../../../shared/schemas/buildings.ts';
import { formatFigure } from '../../../../shared/presentation/field-words.ts';

const HEADING = 'border-b border-rule px-0 pt-1 pb-[5px] text-cap font-semibold';
const CELL = 'h-row border-b border-hairline py-0';

/** The walls of a building: how long each is, and which neighbours stand against it. */
export function BuildingWalls({ walls }: { readonly walls: readonly BuildingWall[] }) {
  if (walls.length === 0) return null;
  return (
    <table aria-label="Walls" className="mt-4 w-full border-separate border-spacing-0 text-small">
      <thead>
        <tr>
          <th scope="col" className={`${HEADING} text-left`}>
            Wall
          </th>
          <th scope="col" className={`${HEADING} text-right`}>
            Length <small className="text-micro font-normal text-ink-3">m</small>
          </th>
          <th scope="col" className={`${HEADING} w-[56%] text-right`}>
            Shared with
          </th>
        </tr>
      </thead>
      <tbody>
        {walls.map(({ letter, length, sharedWith }) => (
          <tr key={letter}>
            <th scope="row" className={`${CELL} text-left font-normal text-ink-2`}>
              {letter}
            </th>
            <td className={`${CELL} text-right`}>
              {formatFigure('eavesHeight', Number(length.toFixed(1)))}
            </td>
            <td className={`${CELL} text-right break-words`}>
              {sharedWith.length === 0 ? (
                <span className="text-ink-3">free</span>
              ) : (
                sharedWith.map(({ reference }) => reference).join(', ')
              )}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
