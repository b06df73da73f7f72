import {
  LARGEST_VOLUME_LOSS,
  type Breakpoint,
} from '../../../../shared/assessment/breakpoint-of-wall.ts';
import type { Range } from '../../../../shared/numerics/range.ts';
import { percentFromRatio } from '../../../../shared/units/percent-from-ratio.ts';
import { BottomAxis } from '../../../components/chart/axis.tsx';
import { linearScale, type Scale } from '../../../../shared/presentation/linear-scale.ts';
import { niceTicks } from '../../../../shared/presentation/nice-ticks.ts';
import { useWidth } from '../../../hooks/use-width.ts';
import { breakpointWords, percentWords } from '../../../../shared/presentation/bracket-words.ts';

type BreakpointBarProps = {
  /** Undefined where none is reached. */
  readonly breakpoint: Breakpoint | undefined;
  readonly volumeLoss: Range;
};

const [HEIGHT, BAND, MEASURE, AXIS] = [84, 26, 52, 62];
const ON_PAPER = 340;
const ROOM_FOR_WORDS = 66;

/** Like a dimension on a drawing: from the central volume loss to the breakpoint. */
function Reserve({
  from,
  to,
  reserve,
}: {
  readonly from: number;
  readonly to: number;
  readonly reserve: number;
}) {
  const middle = (from + to) / 2;
  const words = `reserve ${reserve.toFixed(2)}`.replace('-', '\u2212');
  const fits = Math.abs(to - from) > ROOM_FOR_WORDS + 14;
  return (
    <g>
      <path
        d={`M${from} ${MEASURE}H${to}M${from} ${MEASURE - 3}v6M${to} ${MEASURE - 3}v6`}
        className="stroke-ink"
        strokeWidth=".9"
      />
      {fits && (
        <>
          <rect
            x={middle - ROOM_FOR_WORDS / 2}
            y={MEASURE - 8}
            width={ROOM_FOR_WORDS}
            height="14"
            className="fill-sheet"
          />
          <text
            x={middle}
            y={MEASURE + 3.5}
            textAnchor="middle"
            className="fill-ink text-micro font-semibold"
          >
            {words}
          </text>
        </>
      )}
    </g>
  );
}

function Arrow({
  at,
  volumeLoss,
  width,
}: {
  readonly at: number;
  readonly volumeLoss: number;
  readonly width: number;
}) {
  const isRight = at > width / 2;
  return (
    <g>
      <path d={`M${at} 10V${BAND + 9}`} className="stroke-clay" strokeWidth="1.8" />
      <path d={`M${at} 13l-4.5-8h9z`} className="fill-clay" />
      <text
        x={isRight ? at - 9 : at + 9}
        y="11"
        textAnchor={isRight ? 'end' : 'start'}
        className="fill-clay-deep text-cap font-semibold"
      >
        {percentWords(volumeLoss, 2)}
      </text>
    </g>
  );
}

function Band({ across, volumeLoss }: { readonly across: Scale; readonly volumeLoss: Range }) {
  const [low, central, high] = [volumeLoss.low, volumeLoss.central, volumeLoss.high].map(across);
  const [left, right] = [low ?? 0, high ?? 0];
  return (
    <>
      <rect
        x={left}
        y={BAND - 7}
        width={Math.max(1, right - left)}
        height="14"
        className="fill-band stroke-band-line"
      />
      <path d={`M${central ?? 0} ${BAND - 9}v18`} className="stroke-ink" strokeWidth="3" />
    </>
  );
}

/** The volume loss that is likely, that which breaks the wall, and the reserve between. */
export function BreakpointBar({ breakpoint, volumeLoss }: BreakpointBarProps) {
  const { width, frame } = useWidth(250, ON_PAPER);
  const broken = breakpoint?.volumeLoss;
  const most = Math.max(
    volumeLoss.high * 1.4,
    broken === undefined ? LARGEST_VOLUME_LOSS : broken * 1.15,
  );
  const across = linearScale([0, most], [8, width - 12]);
  return (
    <div ref={frame} className="print:max-w-[340px]">
      <svg
        viewBox={`0 0 ${width} ${HEIGHT}`}
        width="100%"
        role="img"
        aria-label={breakpointWords(breakpoint, volumeLoss)}
        className="block"
      >
        <path d={`M0 ${BAND}H${width}`} className="stroke-rule" />
        <Band across={across} volumeLoss={volumeLoss} />
        {breakpoint !== undefined && (
          <>
            <Arrow
              at={across(breakpoint.volumeLoss)}
              volumeLoss={breakpoint.volumeLoss}
              width={width}
            />
            <Reserve
              from={across(volumeLoss.central)}
              to={across(breakpoint.volumeLoss)}
              reserve={breakpoint.reserveOverCentral}
            />
          </>
        )}
        <path d={`M${across(0)} ${AXIS}H${across(most)}`} className="stroke-ink-2" />
        <BottomAxis
          scale={(percent) => across(percent / 100)}
          ticks={niceTicks(0, percentFromRatio(most), 5)}
          at={AXIS}
          words={(tick) => (tick === 0 ? '0\u00a0%' : String(tick))}
        />
      </svg>
    </div>
  );
}
