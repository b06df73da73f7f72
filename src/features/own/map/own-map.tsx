import { useEffect, useMemo, useRef } from 'react';
import type { OwnBuilding } from '../../../../shared/schemas/own.ts';
import { useWidth } from '../../../hooks/use-width.ts';
import { drawPicture } from '../../schemes/picture/draw-picture.ts';
import { pictureFrame, placeInPicture } from '../../schemes/picture/picture-frame.ts'; // prettier-ignore
import { placeOf } from '../own-words.ts';
import { boundsRound } from './own-frame.ts';
import { pathOf } from './path-of.ts';
import { ScaleBar } from './scale-bar.tsx';
import { Tunnels, tunnelsName, type OnMap } from './tunnels.tsx';
import { useGround } from './use-ground.ts';

const [BEFORE, ON_PAPER] = [452, 452];
const SHAPE = 0.56;

function Label({
  x,
  y,
  children,
}: {
  readonly x: number;
  readonly y: number;
  readonly children: string;
}) {
  const half = children.length * 4.2 + 10;
  return (
    <g transform={`translate(${x} ${y})`}>
      <rect x={-half} y={-34} width={2 * half} height={27} rx={2} className="fill-ink" />
      <path d="M-6 -8h12l-6 8z" className="fill-ink" />
      <text y={-16} fontSize={14} fontWeight={600} textAnchor="middle" className="fill-ink-on-dark">
        {children}
      </text>
    </g>
  );
}

function Home({ frame, building }: OnMap) {
  const corners = building.outline.flat(2).map((at) => placeInPicture(frame, at));
  const [xs, ys] = [corners.map(([x]) => x), corners.map(([, y]) => y)];
  const middle = (Math.min(...xs) + Math.max(...xs)) / 2;
  const d = building.outline.flat().map((ring) => `M${pathOf(frame, ring)}Z`).join(''); // prettier-ignore
  return (
    <>
      <path
        d={d}
        fillRule="evenodd"
        className="fill-clay stroke-sheet"
        strokeWidth={2.5}
        paintOrder="stroke"
      />
      <Label x={middle} y={Math.max(36, Math.min(...ys) - 1)}>
        {`Your ${placeOf(building)}`}
      </Label>
    </>
  );
}

/** In words, what the map shows. */
function mapWords({ use, figures }: OwnBuilding): string {
  const tunnels =
    figures === null || figures.lines.length === 0 ? '' : ` and ${tunnelsName(figures.tunnels)}`;
  return `Map: your ${placeOf({ use })}${tunnels}. North is at the top.`;
}

/** A building and the tunnels near it on a small map; no other building is on it. */
export function OwnMap({ building }: { readonly building: OwnBuilding }) {
  const { width, frame: box } = useWidth(BEFORE, ON_PAPER);
  const size = useMemo(() => ({ width, height: Math.round(width * SHAPE) }), [width]);
  const bounds = useMemo(() => boundsRound(building, size), [building, size]);
  const frame = pictureFrame(bounds, size);
  const ground = useGround(bounds, size);
  const canvas = useRef<HTMLCanvasElement>(null);
  useEffect(() => {
    if (ground !== undefined && canvas.current !== null) drawPicture(canvas.current, ground);
  }, [ground]);
  return (
    <div className="border border-rule">
      <div ref={box} className="relative bg-land" style={{ height: size.height }}>
        <canvas ref={canvas} aria-hidden="true" className="absolute inset-0 size-full" />
        <svg
          role="img"
          aria-label={mapWords(building)}
          viewBox={`0 0 ${size.width} ${size.height}`}
          className="absolute inset-0 size-full overflow-hidden"
        >
          <Tunnels frame={frame} building={building} />
          <Home frame={frame} building={building} />
          <ScaleBar frame={frame} />
        </svg>
      </div>
    </div>
  );
}
