import type { GroundFrame } from './ground-frame.ts';
import type { Ink, Mark, Spot, Stroke } from './marks.ts';
import type { PlanBackground } from './plan-material.ts';

/** What streets and railways are drawn as wide as, in m: files say nothing of widths. The least in mm. */
const [STREET, RAIL, LEAST] = [6, 2.5, 0.4];
const EDGE = 0.24;

const AREAS: Readonly<Record<PlanBackground['layer'], { readonly fill: Ink; readonly edge: Ink }>> =
  {
    water: { fill: 'water', edge: 'waterEdge' },
    parks: { fill: 'park', edge: 'hairline' },
    streets: { fill: 'street', edge: 'streetEdge' },
    rail: { fill: 'street', edge: 'rule' },
  };

function onPaper({ place }: GroundFrame, { lines }: PlanBackground): Spot[][] {
  return lines.map((line) => line.map(place));
}

function areaMark(frame: GroundFrame, one: PlanBackground): Mark {
  const { fill, edge } = AREAS[one.layer];
  const stroke = { ink: edge, width: 0.13 };
  return { kind: 'shape', rings: onPaper(frame, one), isClosed: true, fill, stroke };
}

function wayMark(frame: GroundFrame, one: PlanBackground, stroke: Stroke): Mark {
  return { kind: 'shape', rings: onPaper(frame, one), isClosed: false, stroke };
}

/**
 * What lies under the buildings: water and parks, streets with their edges, railways.
 *
 * Units: mm. Valid: any background. Source: [own].
 */
export function backgroundMarks(frame: GroundFrame, background: readonly PlanBackground[]): Mark[] {
  const wide = (metres: number) => Math.max(LEAST, (metres * 1000) / frame.denominator);
  const of = (layer: PlanBackground['layer'], isArea: boolean) =>
    background.filter((one) => one.layer === layer && one.isArea === isArea);
  const [streets, rails] = [of('streets', false), of('rail', false)];
  const areas = (['water', 'parks', 'streets', 'rail'] as const).flatMap((layer) =>
    of(layer, true),
  );
  return [
    ...areas.map((one) => areaMark(frame, one)),
    ...of('water', false).map((one) => wayMark(frame, one, { ink: 'waterEdge', width: 0.4 })),
    ...streets.map((one) => wayMark(frame, one, { ink: 'streetEdge', width: wide(STREET) + EDGE })),
    ...streets.map((one) => wayMark(frame, one, { ink: 'street', width: wide(STREET) })),
    ...rails.map((one) => wayMark(frame, one, { ink: 'rule', width: wide(RAIL) })),
    ...rails.map((one) =>
      wayMark(frame, one, { ink: 'paper', width: wide(RAIL) * 0.6, dash: [2, 2] }),
    ),
  ];
}
