import { useId } from 'react';
import type { OpenedWall } from '../../../../shared/assessment/open-wall.ts';
import { BottomAxis, LeftAxis } from '../../../components/chart/axis.tsx';
import { pathBetween, pathOf, type Place } from '../../../components/chart/path-of.ts';
import { useWidth } from '../../../hooks/use-width.ts';
import { millimetresFromMetres } from '../../../../shared/units/millimetres-from-metres.ts';
import {
  MOVEMENT_FOOT,
  MOVEMENT_TOP,
  SECTION,
  SECTION_HEIGHT,
  sectionFrame,
  type SectionFrame,
} from '../../../../shared/presentation/section-frame.ts';
import { sectionWords } from '../section-words.ts';
import { ZoneChord, ZoneGround, ZoneStrain } from './section-zones.tsx';
import { ZonePatterns } from './zone-patterns.tsx';

type Drawn = Pick<OpenedWall, 'section' | 'result' | 'rules'>;

type LinesProps = { readonly drawn: Drawn; readonly frame: SectionFrame };

function placesOf(
  { drawn, frame }: LinesProps,
  what: 'settlement' | 'settlementLow' | 'settlementHigh',
): Place[] {
  return drawn.section.points.map((point) => [
    frame.along(point.x),
    frame.down(millimetresFromMetres(point[what])),
  ]);
}

function Settlement(props: LinesProps) {
  const { cutOff } = props.drawn.rules;
  const { along, down } = props.frame;
  const { length } = props.drawn.section;
  const ignored = cutOff.kind === 'settlement' ? millimetresFromMetres(cutOff.settlement) : 0;
  return (
    <g fill="none">
      <path
        d={pathBetween(placesOf(props, 'settlementLow'), placesOf(props, 'settlementHigh'))}
        className="fill-band"
        fillOpacity=".55"
      />
      <path
        d={pathOf(placesOf(props, 'settlementLow'))}
        className="stroke-band-line"
        strokeDasharray="1 3"
      />
      <path
        d={pathOf(placesOf(props, 'settlementHigh'))}
        className="stroke-band-line"
        strokeDasharray="5 3"
      />
      {ignored > 0 && (
        <path
          d={`M${along(0)} ${down(ignored)}H${along(length)}`}
          className="stroke-contour"
          strokeDasharray="5 3"
          strokeWidth=".9"
        />
      )}
      <path d={pathOf(placesOf(props, 'settlement'))} className="stroke-ink" strokeWidth="2" />
    </g>
  );
}

function Movement({ drawn, frame }: LinesProps) {
  const { along, movement } = frame;
  const { length, points } = drawn.section;
  const places = points.map(({ x, displacement }): Place => [
    along(x),
    movement(millimetresFromMetres(displacement)),
  ]);
  return (
    <g fill="none">
      <path d={`M${along(0)} ${movement(0)}H${along(length)}`} className="stroke-rule" />
      <path d={pathOf(places)} className="stroke-ink" strokeWidth="1.6" />
      <rect
        x={along(0)}
        y={MOVEMENT_TOP}
        width={along(length) - along(0)}
        height={MOVEMENT_FOOT - MOVEMENT_TOP}
        className="stroke-ink"
      />
      <text x="8" y={MOVEMENT_TOP - 7} className="fill-ink-2 text-micro">
        mm, horizontal movement along the wall; up is away from its start
      </text>
    </g>
  );
}

/** The width that A4 holds upright. */
const ON_PAPER = 700;

/** Settlement along a wall with its zones, chords and strains, and the horizontal movement beneath. */
export function WallSectionChart({ drawn }: { readonly drawn: Drawn }) {
  const prefix = useId();
  const { width, frame: box } = useWidth(600, ON_PAPER);
  const frame = sectionFrame(drawn.section, width);
  const { zones, governingZone } = drawn.result;
  const { along, ticks } = frame;
  const span = along(drawn.section.length) - along(0);
  const shared = { frame, prefix };
  return (
    <div ref={box}>
      <svg
        viewBox={`0 0 ${width} ${SECTION_HEIGHT}`}
        width="100%"
        role="img"
        aria-label={sectionWords(drawn)}
        className="block"
      >
        <ZonePatterns prefix={prefix} />
        {zones.map((zone) => (
          <ZoneGround key={zone.start} zone={zone} {...shared} />
        ))}
        <LeftAxis scale={frame.down} ticks={ticks.down} at={SECTION.left} across={span} />
        <Settlement drawn={drawn} frame={frame} />
        {zones.map((zone, index) => (
          <ZoneChord
            key={zone.start}
            zone={zone}
            governs={index === governingZone}
            drawn={drawn}
            frame={frame}
          />
        ))}
        <rect
          x={SECTION.left}
          y={SECTION.top}
          width={span}
          height={SECTION.settlement}
          fill="none"
          className="stroke-ink"
        />
        <BottomAxis
          scale={along}
          ticks={ticks.along}
          at={SECTION.top + SECTION.settlement}
          words={(x) => `${x}\u00a0m`}
        />
        <text x="8" y={SECTION.top - 8} className="fill-ink-2 text-micro">
          mm
        </text>
        {zones.map((zone) => (
          <ZoneStrain key={zone.start} zone={zone} {...shared} />
        ))}
        <LeftAxis scale={frame.movement} ticks={ticks.movement} at={SECTION.left} />
        <Movement drawn={drawn} frame={frame} />
      </svg>
    </div>
  );
}
