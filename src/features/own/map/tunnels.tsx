import type { OwnBuilding } from '../../../../shared/schemas/own.ts';
import { placeInPicture, type PictureFrame } from '../../schemes/picture/picture-frame.ts';
import { nameSpot } from './name-spot.ts';
import { pathOf } from './path-of.ts';

export type OnMap = { readonly frame: PictureFrame; readonly building: OwnBuilding };

/** What the tunnels near a building are called. */
export function tunnelsName(tunnels: number): string {
  if (tunnels === 1) return 'the tunnel';
  return tunnels === 2 ? 'the two tunnels' : 'the tunnels';
}

function TunnelName({ frame, building }: OnMap) {
  const { figures, outline } = building;
  const lines = (figures?.lines ?? []).map((line) => line.map((at) => placeInPicture(frame, at)));
  const [corner] = outline.flat(2);
  const middle = corner === undefined ? ([0, 0] as const) : placeInPicture(frame, corner);
  const spot = nameSpot(lines.slice(0, 1), middle, frame);
  if (spot === null || figures === null) return null;
  const name = tunnelsName(figures.tunnels);
  return (
    <text
      transform={`translate(${spot.x} ${spot.y}) rotate(${spot.degrees})`}
      y={5}
      fontSize={13}
      fontWeight={600}
      textAnchor="middle"
      strokeWidth={4}
      paintOrder="stroke"
      className="fill-ink stroke-paper-raised"
    >
      {`${name.charAt(0).toUpperCase()}${name.slice(1)}`}
    </text>
  );
}

/** The tunnels near a building, as wide as they are. */
export function Tunnels({ frame, building }: OnMap) {
  const { figures } = building;
  if (figures === null) return null;
  const width = figures.diameter * frame.pixelsPerMetre;
  return (
    <>
      {figures.lines.map((line, k) => {
        const d = `M${pathOf(frame, line)}`;
        return (
          <g key={k} fill="none">
            <path
              d={d}
              className="stroke-paper-raised"
              strokeOpacity={0.6}
              strokeWidth={width + 3}
            />
            <path d={d} className="stroke-ink" strokeOpacity={0.28} strokeWidth={width} />
          </g>
        );
      })}
      <TunnelName frame={frame} building={building} />
    </>
  );
}
