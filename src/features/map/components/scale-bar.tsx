import type { Map as MapLibreMap } from 'maplibre-gl';
import type { GridProjection } from '../place/grid-projection.ts';
import { scaleBarLength } from '../place/scale-bar-length.ts';
import { metresPerPixel } from '../place/view-of-map.ts';
import { useMapFigure } from '../hooks/use-map-figure.ts';

const LONGEST = 190;
/** Room for the figures at both ends. */
const LEFT = 8;
const RIGHT = 34;
const BAR = 'fill-paper-raised stroke-ink';

type ScaleBarProps = { readonly map: MapLibreMap; readonly projection: GridProjection };

function NorthArrow() {
  return (
    <svg width="20" height="32" viewBox="0 0 20 32" aria-hidden="true" className="flex-none">
      <path d="M10 1 16 18 10 14 4 18z" className="fill-ink" />
      <text x="10" y="31" textAnchor="middle" className="fill-ink text-cap font-semibold">
        N
      </text>
    </svg>
  );
}

/** How long a round length is on the map, and that north is up. */
export function ScaleBar({ map, projection }: ScaleBarProps) {
  const scale = useMapFigure(map, () => metresPerPixel(map, projection));
  if (scale === null || scale <= 0) return null;
  const { pixels, figures } = scaleBarLength(scale, LONGEST);
  const middle = LEFT + pixels / 2;
  const end = LEFT + pixels;
  return (
    <div
      role="img"
      aria-label={`Scale bar of ${figures[2]}; north is up`}
      className="flex items-center gap-1 rounded border border-rule bg-paper-raised py-0.5 pr-1.5 pl-1"
    >
      <svg width={end + RIGHT} height="32" className="fill-ink text-micro" textAnchor="middle">
        <text x={LEFT} y="13">
          {figures[0]}
        </text>
        <text x={middle} y="13">
          {figures[1]}
        </text>
        <text x={end} y="13">
          {figures[2]}
        </text>
        <rect x={middle} y="20.5" width={pixels / 2} height="4" className={BAR} />
        <rect x={LEFT} y="20.5" width={pixels / 2} height="4" className="fill-ink stroke-ink" />
        <path d={`M${LEFT} 18v9M${middle} 18v9M${end} 18v9`} className="stroke-ink" />
      </svg>
      <NorthArrow />
    </div>
  );
}
