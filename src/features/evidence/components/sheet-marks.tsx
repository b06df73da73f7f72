import { memo, useId } from 'react';
import { INK_COLOURS } from '../../../../shared/evidence/ink-colours.ts';
import { lookOfTone, TONE_EDGE, TONE_TILE } from '../../../../shared/evidence/look-of-tone.ts';
import type { Mark, Spot } from '../../../../shared/evidence/marks.ts';
import { HATCH_TILE } from '../../../../shared/presentation/damage-style.ts';
import { HatchPatterns, hatchFill } from '../../../components/ui/hatch-patterns.tsx';

const MM_PER_POINT = 25.4 / 72;

type Of<Kind extends Mark['kind']> = Extract<Mark, { kind: Kind }>;

function ringPath(ring: readonly Spot[], isClosed: boolean): string {
  const points = ring.map(([x, y]) => `${x.toFixed(2)} ${y.toFixed(2)}`);
  return points.length === 0 ? '' : `M${points.join('L')}${isClosed ? 'Z' : ''}`;
}

function pathOf(rings: readonly (readonly Spot[])[], isClosed: boolean): string {
  return rings.map((ring) => ringPath(ring, isClosed)).join('');
}

function Toned({ mark: { tone, rings }, prefix }: { mark: Of<'toned'>; prefix: string }) {
  const { category, fill, edge } = lookOfTone(tone);
  return (
    <path
      d={pathOf(rings, true)}
      fillRule="evenodd"
      fill={category === null ? fill : hatchFill(prefix, category)}
      stroke={edge}
      strokeWidth={TONE_EDGE}
    />
  );
}

function Shape({ mark: { rings, isClosed, fill, stroke } }: { mark: Of<'shape'> }) {
  return (
    <path
      d={pathOf(rings, isClosed)}
      fillRule="evenodd"
      fill={fill === undefined ? 'none' : INK_COLOURS[fill]}
      stroke={stroke === undefined ? 'none' : INK_COLOURS[stroke.ink]}
      strokeWidth={stroke?.width}
      strokeDasharray={stroke?.dash?.join(' ')}
      strokeLinejoin="round"
    />
  );
}

function Words({ mark }: { mark: Of<'words'> }) {
  const [x, y] = mark.at;
  const [c, s] = mark.along ?? [1, 0];
  return (
    <text
      transform={`matrix(${c} ${s} ${-s} ${c} ${x} ${y})`}
      fontSize={mark.size * MM_PER_POINT}
      fontWeight={mark.isStrong === true ? 600 : 400}
      textAnchor={mark.anchor ?? 'start'}
      fill={INK_COLOURS[mark.ink ?? 'ink']}
    >
      {mark.words}
    </text>
  );
}

type WithinProps = { readonly mark: Of<'within'>; readonly prefix: string; readonly shift: Spot };

function Within({ mark: { window, marks }, prefix, shift: [dx, dy] }: WithinProps) {
  const id = useId();
  const { left, top, right, bottom } = window;
  return (
    <g clipPath={`url(#${id})`}>
      <clipPath id={id}>
        <rect x={left} y={top} width={right - left} height={bottom - top} />
      </clipPath>
      <g transform={dx === 0 && dy === 0 ? undefined : `translate(${dx} ${dy})`}>
        <Marks marks={marks} prefix={prefix} />
      </g>
    </g>
  );
}

const NOT_MOVED: Spot = [0, 0];

const Marks = memo(function Marks({
  marks,
  prefix,
  shift = NOT_MOVED,
}: {
  readonly marks: readonly Mark[];
  readonly prefix: string;
  readonly shift?: Spot;
}) {
  return marks.map((mark, k) => {
    if (mark.kind === 'toned') return <Toned key={k} {...{ mark, prefix }} />;
    if (mark.kind === 'words') return <Words key={k} mark={mark} />;
    if (mark.kind === 'shape') return <Shape key={k} mark={mark} />;
    // what the frame of a plan shows comes first
    return <Within key={k} {...{ mark, prefix }} shift={k === 0 ? shift : NOT_MOVED} />;
  });
});

/** The marks of a sheet inside an SVG whose units are mm; the map of a plan may be moved in its frame. */
export function SheetMarks({
  marks,
  shift,
}: {
  readonly marks: readonly Mark[];
  readonly shift: Spot;
}) {
  const prefix = `sheet${useId()}`;
  return (
    <>
      <HatchPatterns prefix={prefix} scale={TONE_TILE / HATCH_TILE} />
      <Marks {...{ marks, prefix, shift }} />
    </>
  );
}
