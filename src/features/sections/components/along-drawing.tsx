import type { PointerEvent } from 'react';
import type { LongSectionRow } from '../../../../shared/assessment/long-section.ts';
import type { SettlementOnLine } from '../../../../shared/assessment/settlement-along.ts';
import { BottomAxis, LeftAxis } from '../../../components/chart/axis.tsx';
import { BracketLines } from '../../../components/chart/bracket-lines.tsx';
import { niceTicks } from '../../../../shared/presentation/nice-ticks.ts';
import { pathBetween, pathOf, type Place } from '../../../components/chart/path-of.ts';
import { chainageWords } from '../../../../shared/presentation/chainage-words.ts';
import { figure } from '../../../../shared/presentation/design-words.ts';
import type { AlongLayout } from '../along-layout.ts';
import { AlongCursor } from './along-cursor.tsx';

type AlongDrawingProps = {
  readonly rows: readonly LongSectionRow[];
  readonly settlements: readonly SettlementOnLine[];
  readonly layout: AlongLayout;
  readonly chainage: number;
  /** The level of the axis at the chainage, in m. */
  readonly axis: number;
  readonly onGo: (chainage: number) => void;
  readonly label: string;
};

const MILLIMETRES = 1000;
const APART = { chainage: 90, levels: 26, settlement: 18 };

/** Ground, crown, axis and invert. */
function Levels({ rows, layout }: Pick<AlongDrawingProps, 'rows' | 'layout'>) {
  const { x, levels, left, right } = layout;
  const placesOf = (of: keyof LongSectionRow): Place[] =>
    rows.map((row) => [x(row.chainage), levels.y(row[of])]);
  const [crown, invert, ground] = [placesOf('crown'), placesOf('invert'), placesOf('ground')];
  const ticks = niceTicks(levels.from, levels.to, (levels.bottom - levels.top) / APART.levels);
  const bed: Place[] = [
    [left, levels.bottom],
    [right, levels.bottom],
  ];
  return (
    <g className="fill-none">
      <path d={pathBetween(ground, bed)} className="fill-paper" />
      <LeftAxis
        scale={levels.y}
        ticks={ticks}
        at={left}
        across={right - left}
        words={(level) =>
          `${level > 0 ? '+' : ''}${figure(level, 1)}${level === ticks.at(-1) ? ' m' : ''}`
        }
      />
      <path d={pathBetween(crown, invert)} className="fill-sheet" />
      <path d={`${pathOf(crown)}${pathOf(invert)}`} className="stroke-ink" strokeWidth="1.4" />
      <path d={pathOf(placesOf('axis'))} className="stroke-ink-3" strokeDasharray="8 2.2 1.4 2.2" />
      <path d={pathOf(ground)} className="stroke-ink" strokeWidth="2" />
    </g>
  );
}

/** Settlement over the line, drawn downwards. */
function Settlements({ settlements, layout }: Pick<AlongDrawingProps, 'settlements' | 'layout'>) {
  const { x, settlement: panel, left, right } = layout;
  const places = settlements.map(({ chainage, settlement }) => {
    if (settlement === null) return null;
    const down = (metres: number) => panel.y(metres * MILLIMETRES);
    const { low, central, high } = settlement;
    return { x: x(chainage), low: down(low), central: down(central), high: down(high) };
  });
  const count = Math.max(1, (panel.bottom - panel.top) / APART.settlement);
  return (
    <>
      <LeftAxis
        scale={panel.y}
        ticks={niceTicks(0, panel.most, count)}
        at={left}
        across={right - left}
        words={(mm) => (mm === 0 ? '0 mm' : String(mm))}
      />
      <BracketLines places={places} />
    </>
  );
}

/** The long section over settlement on the same chainage; a press or drag takes the section along. */
export function AlongDrawing(props: AlongDrawingProps) {
  const { rows, settlements, layout, chainage, axis, onGo, label } = props;
  const { width, height, left, right, x, settlement } = layout;
  const length = rows.at(-1)?.chainage ?? 0;

  function go({ clientX, currentTarget, buttons }: PointerEvent<SVGSVGElement>): void {
    if (buttons !== 1) return;
    const at = layout.chainageAt(clientX - currentTarget.getBoundingClientRect().left);
    onGo(Math.min(length, Math.max(0, at)));
  }
  return (
    <svg
      role="img"
      aria-label={label}
      width={width}
      height={height}
      onPointerDown={go}
      onPointerMove={go}
      className="block cursor-ew-resize touch-pan-y"
    >
      <Levels {...{ rows, layout }} />
      <Settlements {...{ settlements, layout }} />
      <path d={`M${left} ${settlement.bottom}H${right}`} className="stroke-ink" />
      <BottomAxis
        scale={x}
        ticks={niceTicks(0, length, (right - left) / APART.chainage)}
        at={settlement.bottom}
        words={chainageWords}
      />
      <AlongCursor {...{ settlements, layout, chainage, axis }} />
    </svg>
  );
}
