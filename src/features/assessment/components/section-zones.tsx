import type { AssessedZone } from '../../../../shared/assessment/assess-wall.ts';
import type { WallSection } from '../../../../shared/assessment/section-of-wall.ts';
import { millimetresFromMetres } from '../../../../shared/units/millimetres-from-metres.ts';
import { percentWords } from '../../../../shared/presentation/bracket-words.ts';
import {
  SECTION,
  STRIP_TOP,
  type SectionFrame,
} from '../../../../shared/presentation/section-frame.ts';
import { zoneFill } from './zone-patterns.tsx';

type ZoneProps = {
  readonly zone: AssessedZone;
  readonly frame: SectionFrame;
  readonly prefix: string;
};

const FOOT = SECTION.top + SECTION.settlement;
/** Narrower zones stand without words; their figures are in the table of zones. */
const ROOM_FOR_NAME = 84;
const ROOM_FOR_STRAIN = 112;

function middleOf({ start, end }: AssessedZone, { along }: SectionFrame): number {
  return along((start + end) / 2);
}

function widthOf({ start, end }: AssessedZone, { along }: SectionFrame): number {
  return along(end) - along(start);
}

function modeName({ mode }: AssessedZone): string {
  return mode === 'sagging' ? 'Sagging' : 'Hogging';
}

/** The ground of a zone, hatched by the way it bends, with its name above. */
export function ZoneGround({ zone, frame, prefix }: ZoneProps) {
  const { along } = frame;
  const width = widthOf(zone, frame);
  return (
    <g>
      <rect
        x={along(zone.start)}
        y={SECTION.top}
        width={width}
        height={SECTION.settlement}
        fill={zoneFill(prefix, zone.mode)}
      />
      <path
        d={`M${along(zone.end)} ${SECTION.top - 4}V${FOOT}`}
        className="stroke-rule"
        strokeDasharray="2 2"
      />
      {width >= ROOM_FOR_NAME && (
        <text
          x={middleOf(zone, frame)}
          y={SECTION.top - 8}
          textAnchor="middle"
          className={`text-cap font-semibold ${zone.mode === 'sagging' ? 'fill-select' : 'fill-clay-deep'}`}
        >
          {modeName(zone)} {(zone.end - zone.start).toFixed(1)} m
        </text>
      )}
    </g>
  );
}

/** The horizontal strain that counts in a zone, under it. */
export function ZoneStrain({ zone, frame, prefix }: ZoneProps) {
  const width = widthOf(zone, frame);
  const sense = zone.horizontalStrain < 0 ? 'squeeze' : 'stretch';
  return (
    <g>
      <rect
        x={frame.along(zone.start)}
        y={STRIP_TOP}
        width={width}
        height={SECTION.strip}
        fill={zoneFill(prefix, zone.mode)}
        className="stroke-rule"
      />
      {width >= ROOM_FOR_STRAIN && (
        <text
          x={middleOf(zone, frame)}
          y={STRIP_TOP + 12.5}
          textAnchor="middle"
          className="fill-ink text-micro"
        >
          ε
          <tspan fontSize="8" dy="2">
            h
          </tspan>
          <tspan dy="-2">
            {' '}
            {percentWords(zone.horizontalStrain, 4)}, {sense}
          </tspan>
        </text>
      )}
    </g>
  );
}

function settlementAt({ points }: WallSection, x: number): number {
  return points.find((point) => point.x === x)?.settlement ?? 0;
}

type ChordProps = {
  readonly zone: AssessedZone;
  readonly governs: boolean;
  readonly drawn: { readonly section: WallSection };
  readonly frame: SectionFrame;
};

/** The chord of a zone with the largest distance from it; that of the governing zone says how much. */
export function ZoneChord({ zone, governs, drawn, frame }: ChordProps) {
  const { along, down } = frame;
  const { start, end, deflectionAt } = zone;
  const at = (x: number) => down(millimetresFromMetres(settlementAt(drawn.section, x)));
  const share = (deflectionAt - start) / (end - start);
  const onChord = at(start) + share * (at(end) - at(start));
  const x = along(deflectionAt);
  const isLow = onChord > SECTION.top + SECTION.settlement / 2;
  const wordsY = SECTION.top + SECTION.settlement * (isLow ? 0.2 : 0.82);
  const toRight = x < (along(0) + along(drawn.section.length)) / 2;
  return (
    <g className="stroke-clay" strokeWidth={governs ? 1.6 : 1}>
      <path d={`M${along(start)} ${at(start)}L${along(end)} ${at(end)}`} />
      <path d={`M${x} ${onChord}V${at(deflectionAt)}`} strokeWidth={governs ? 2.4 : 1.4} />
      {[start, end].map((one) => (
        <circle key={one} cx={along(one)} cy={at(one)} r="3" className="fill-sheet" />
      ))}
      {governs && (
        <g>
          <path
            d={`M${x} ${onChord}V${wordsY - 4}h${toRight ? 6 : -6}`}
            fill="none"
            strokeWidth=".9"
          />
          <text
            x={x + (toRight ? 10 : -10)}
            y={wordsY}
            textAnchor={toRight ? 'start' : 'end'}
            stroke="var(--sheet)"
            strokeWidth="3"
            paintOrder="stroke"
            className="fill-clay-deep text-small font-semibold"
          >
            Δ {millimetresFromMetres(zone.deflection).toFixed(2)} mm over L{' '}
            {(end - start).toFixed(1)} m
          </text>
        </g>
      )}
    </g>
  );
}
