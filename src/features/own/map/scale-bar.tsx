import type { PictureFrame } from '../../schemes/picture/picture-frame.ts';

const METRES = [10, 25, 50, 100, 250];
const LONGEST = 80;

/** How long so many metres are on the map. */
export function ScaleBar({ frame }: { readonly frame: PictureFrame }) {
  const { width, height, pixelsPerMetre } = frame;
  const metres = METRES.findLast((one) => one * pixelsPerMetre <= LONGEST) ?? 10;
  const length = metres * pixelsPerMetre;
  return (
    <g transform={`translate(${width - length - 84} ${height - 16})`}>
      <path d={`M0 0h${length}M0 -4v8M${length} -4v8`} className="stroke-ink" strokeWidth={1.6} />
      <text
        x={length + 6}
        y={4}
        fontSize={12}
        strokeWidth={4}
        paintOrder="stroke"
        className="fill-ink stroke-paper-raised"
      >
        {`${metres} metres`}
      </text>
    </g>
  );
}
