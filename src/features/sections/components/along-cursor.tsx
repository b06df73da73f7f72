import type { SettlementOnLine } from '../../../../shared/assessment/settlement-along.ts';
import { chainageWords } from '../../../../shared/presentation/chainage-words.ts';
import type { AlongLayout } from '../along-layout.ts';
import { metres, millimetres } from '../section-words.ts';

type AlongCursorProps = {
  readonly settlements: readonly SettlementOnLine[];
  readonly layout: AlongLayout;
  readonly chainage: number;
  /** The level of the axis there, in m. */
  readonly axis: number;
};

const MILLIMETRES = 1000;

function centralAt(settlements: readonly SettlementOnLine[], chainage: number): number | null {
  const length = settlements.at(-1)?.chainage ?? 0;
  if (length === 0) return null;
  const nearest = settlements[Math.round((chainage / length) * (settlements.length - 1))];
  return nearest?.settlement?.central ?? null;
}

/** Where the section across is: the clay line over both drawings, with the settlement there. */
export function AlongCursor({ settlements, layout, chainage, axis }: AlongCursorProps) {
  const { x, levels, settlement, left, right } = layout;
  const at = x(chainage);
  const central = centralAt(settlements, chainage);
  const isNearEnd = at > (left + right) / 2;
  const beside = { x: at + (isNearEnd ? -7 : 7), textAnchor: isNearEnd ? 'end' : 'start' } as const;
  return (
    <g>
      <path
        d={`M${at} ${levels.top - 6}V${settlement.bottom}`}
        className="stroke-clay"
        strokeWidth="1.4"
      />
      <text {...beside} y={levels.top - 4} className="fill-clay-deep text-cap font-semibold">
        {chainageWords(chainage)}, axis {metres(axis, 1)} m
      </text>
      {central !== null && (
        <>
          <circle
            cx={at}
            cy={settlement.y(central * MILLIMETRES)}
            r="3"
            className="fill-sheet stroke-ink"
          />
          <text {...beside} y={settlement.top + 9} className="fill-ink text-cap font-semibold">
            {millimetres(central)} mm
          </text>
        </>
      )}
    </g>
  );
}
