import type { AssessedZone } from '../../../shared/assessment/assess-wall.ts';
import type { WallSection } from '../../../shared/assessment/section-of-wall.ts';
import type { Mode } from '../../../shared/building/curvature-runs.ts';
import { percentWords } from '../../../shared/presentation/bracket-words.ts';
import {
  SECTION,
  STRIP_TOP,
  type SectionFrame,
} from '../../../shared/presentation/section-frame.ts';
import { millimetresFromMetres } from '../../../shared/units/millimetres-from-metres.ts';
import { hatchStrokes } from '../pdf/hatch.ts';
import { INKS } from '../pdf/inks.ts';
import { label } from '../pdf/label.ts';
import type { Paper } from '../pdf/paper.ts';
import { drawLine, type Place } from '../pdf/trace.ts';
import { strainSign } from './signs.ts';

const FOOT = SECTION.top + SECTION.settlement;
/** Narrower zones stand without words; their figures are in the table of zones. */
const ROOM_FOR_NAME = 84;
const ROOM_FOR_STRAIN = 112;

/** Sagging lies in level lines, hogging stands in upright ones: neither is a hatch of damage. */
const LOOKS = {
  sagging: {
    ground: INKS.selectWash,
    lean: 'level',
    colour: '#c9d6e6',
    ink: INKS.select,
    name: 'Sagging',
  },
  hogging: {
    ground: INKS.clayWash,
    lean: 'upright',
    colour: '#e9cdbd',
    ink: INKS.clayDeep,
    name: 'Hogging',
  },
} as const satisfies Record<Mode, object>;

function fillZone(
  paper: Paper,
  { mode, start, end }: AssessedZone,
  { along }: SectionFrame,
  top: number,
  height: number,
): void {
  const { doc } = paper;
  const { ground, lean, colour } = LOOKS[mode];
  const [left, right] = [along(start), along(end)];
  const shape = () => {
    doc.rect(left, top, right - left, height);
  };
  doc.save().fillOpacity(0.55);
  shape();
  doc.fill(ground).restore();
  const bounds = { left, top, right, bottom: top + height };
  hatchStrokes(paper, shape, bounds, { strokes: [{ lean, pitch: 6 }], colour, width: 0.6 });
}

/** The ground of a zone, hatched by the way it bends, with its name above. */
export function drawZoneGround(paper: Paper, zone: AssessedZone, frame: SectionFrame): void {
  const { along } = frame;
  const [left, right] = [along(zone.start), along(zone.end)];
  const { name, ink } = LOOKS[zone.mode];
  fillZone(paper, zone, frame, SECTION.top, SECTION.settlement);
  drawLine(paper, [[right, SECTION.top - 4], [right, FOOT]], { ink: INKS.rule, dash: [2, 2] }); // prettier-ignore
  if (right - left < ROOM_FOR_NAME) return;
  const words = `${name} ${(zone.end - zone.start).toFixed(1)} m`;
  label(paper, words, (left + right) / 2, SECTION.top - 8, {
    size: 11,
    weight: 'strong',
    ink,
    anchor: 'middle',
  });
}

/** The horizontal strain that counts in a zone, under it. */
export function drawZoneStrain(paper: Paper, zone: AssessedZone, frame: SectionFrame): void {
  const { along } = frame;
  const [left, right] = [along(zone.start), along(zone.end)];
  fillZone(paper, zone, frame, STRIP_TOP, SECTION.strip);
  paper.doc
    .lineWidth(1)
    .strokeColor(INKS.rule)
    .rect(left, STRIP_TOP, right - left, SECTION.strip)
    .stroke();
  if (right - left < ROOM_FOR_STRAIN) return;
  const sense = zone.horizontalStrain < 0 ? 'squeeze' : 'stretch';
  const words = strainSign('h', `${percentWords(zone.horizontalStrain, 4)}, ${sense}`);
  label(paper, words, (left + right) / 2, STRIP_TOP + 12.5, { size: 10, anchor: 'middle' });
}

function settlementAt({ points }: WallSection, x: number): number {
  return points.find((point) => point.x === x)?.settlement ?? 0;
}

type Chord = {
  readonly zone: AssessedZone;
  readonly governs: boolean;
  readonly section: WallSection;
  readonly frame: SectionFrame;
};

/** The chord of a zone with the largest distance from it; that of the governing zone says how much. */
export function drawChord(paper: Paper, { zone, governs, section, frame }: Chord): void {
  const { along, down } = frame;
  const { start, end, deflectionAt } = zone;
  const at = (x: number) => down(millimetresFromMetres(settlementAt(section, x)));
  const share = (deflectionAt - start) / (end - start);
  const onChord = at(start) + share * (at(end) - at(start));
  const x = along(deflectionAt);
  const ink = INKS.clay;
  const ends: Place[] = [[along(start), at(start)], [along(end), at(end)]]; // prettier-ignore
  drawLine(paper, ends, { ink, width: governs ? 1.6 : 1 });
  drawLine(paper, [[x, onChord], [x, at(deflectionAt)]], { ink, width: governs ? 2.4 : 1.4 }); // prettier-ignore
  for (const [cx, cy] of ends) {
    paper.doc
      .lineWidth(governs ? 1.6 : 1)
      .circle(cx, cy, 3)
      .fillAndStroke(INKS.paper, ink);
  }
  if (!governs) return;
  const isLow = onChord > SECTION.top + SECTION.settlement / 2;
  const wordsY = SECTION.top + SECTION.settlement * (isLow ? 0.2 : 0.82);
  const aside = x < (along(0) + along(section.length)) / 2 ? 1 : -1;
  drawLine(paper, [[x, onChord], [x, wordsY - 4], [x + aside * 6, wordsY - 4]], { ink, width: 0.9 }); // prettier-ignore
  const words = `Δ ${millimetresFromMetres(zone.deflection).toFixed(2)} mm over L ${(end - start).toFixed(1)} m`;
  const anchor = aside > 0 ? 'start' : 'end';
  label(paper, words, x + aside * 10, wordsY, {
    size: 12,
    weight: 'strong',
    ink: INKS.clayDeep,
    anchor,
    onPaper: true,
  });
}
