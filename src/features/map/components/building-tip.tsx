import type { Map as MapLibreMap } from 'maplibre-gl';
import { useCursor } from '../hooks/use-cursor.ts';
import { buildingNamedAt } from '../modes/building-at.ts';

type BuildingTipProps = {
  readonly map: MapLibreMap;
  /** What is said; null while there is nothing under the cursor to say it of. */
  readonly lines: readonly string[] | null;
};

const [BESIDE, WIDTH, HEIGHT] = [14, 230, 90];

/** Beside the cursor, what is known of the building under it. A finger has no cursor; the side says the same. */
export function BuildingTip({ map, lines }: BuildingTipProps) {
  const cursor = useCursor(map);
  if (cursor === null || lines === null) return null;
  const [x, y] = cursor;
  const { clientWidth, clientHeight } = map.getContainer();
  const left = x + BESIDE + WIDTH > clientWidth ? x - BESIDE - WIDTH : x + BESIDE;
  const top = y + BESIDE + HEIGHT > clientHeight ? y - BESIDE - HEIGHT : y + BESIDE;
  return (
    <div
      role="tooltip"
      style={{ left, top, width: WIDTH }}
      className="pointer-events-none! absolute z-10 flex"
    >
      <div className="rounded border border-rule bg-paper-raised px-2 py-1 text-small shadow-lift">
        <b className="block font-semibold">{buildingNamedAt(map, cursor)}</b>
        {lines.map((line) => (
          <span key={line} className="block text-ink-2">
            {line}
          </span>
        ))}
      </div>
    </div>
  );
}
