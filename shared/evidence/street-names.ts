import { cornersOnBuildings, type Outline } from './building-outlines.ts';
import type { GroundFrame } from './ground-frame.ts';
import type { LabelBox } from './label-box.ts';
import { wordsIn } from './label-marks.ts';
import type { Mark, Measure, Spot } from './marks.ts';
import { placeLabels, type Wanted } from './place-labels.ts';
import type { PlanBackground } from './plan-material.ts';
import { spotsAlong } from './spots-along.ts';
import { stretchesIn } from './stretches-in.ts';

/** The size of a street's name in points of print, and the room round it in mm. */
const [SIZE, ROOM] = [6.5, 0.8];
/** So many places of a stretch are tried, those nearest to its middle. */
const TRIED = 12;

/** The stretches of each named street inside of a window, by name. */
function stretchesByName(
  { window, place }: GroundFrame,
  background: readonly PlanBackground[],
): Map<string, Spot[][]> {
  const found = new Map<string, Spot[][]>();
  for (const { layer, name, lines } of background) {
    if (layer !== 'streets' || name === null) continue;
    const stretches = lines.flatMap((line) => stretchesIn(window, line.map(place)));
    found.set(name, [...(found.get(name) ?? []), ...stretches]);
  }
  return found;
}

/** The places of a name on its stretches, the middle of the one with the most room first. */
function spotsOf(stretches: readonly (readonly Spot[])[], wide: number): LabelBox[] {
  const along = stretches.map((stretch) => spotsAlong(stretch, { wide, tall: 2.6 }));
  along.sort((a, b) => b.length - a.length);
  return along.flatMap((spots) => {
    const middle = ((spots[0]?.distance ?? 0) + (spots.at(-1)?.distance ?? 0)) / 2;
    const ranked = spots.toSorted(
      (a, b) => Math.abs(a.distance - middle) - Math.abs(b.distance - middle),
    );
    return ranked.slice(0, TRIED).map(({ box }) => box);
  });
}

/**
 * The names of streets along them, each once, where nothing else stands: they help to find one's way and are
 * no labels that have to be there, so that one without room is left out.
 *
 * Units: mm. Valid: `taken` is what stands on the sheet already, outlines those of all its buildings.
 * Source: [own].
 */
export function streetNameMarks(
  frame: GroundFrame,
  background: readonly PlanBackground[],
  {
    taken,
    outlines,
    measure,
  }: {
    readonly taken: readonly LabelBox[];
    readonly outlines: readonly Outline[];
    readonly measure: Measure;
  },
): Mark[] {
  const on = cornersOnBuildings(outlines);
  const wanted = [...stretchesByName(frame, background)].map(
    ([name, stretches]): Wanted<string> => {
      const spots = spotsOf(stretches, measure(name, SIZE, false) + ROOM);
      return { what: name, spots: spots.filter((box) => on(box) === 0) };
    },
  );
  const { placed } = placeLabels(frame.window, taken, wanted);
  return placed.map(({ what, box }) => wordsIn(box, what, { size: SIZE, ink: 'third' }));
}
