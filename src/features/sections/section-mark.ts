import { chainages } from '../../../shared/geometry/chainages.ts';
import type { SpacePoint } from '../../../shared/geometry/point.ts';
import { MethodError } from '../../../shared/method-error.ts';
import type { AlignmentDesign } from '../../../shared/schemas/alignments.ts';
import { chainageWords } from '../../../shared/presentation/chainage-words.ts';
import { placeBeside } from '../alignments/line-shapes.ts';
import type { SectionShape } from '../map/map-line.ts';

/** Half of the strokes at either end of a mark, as a share of half the mark. */
const END = 0.06;

/** Where a section is on the map: a line across with a stroke at either end, and its chainage. */
export function sectionMark(
  { line }: Pick<AlignmentDesign, 'line'>,
  chainage: number,
  halfWidth: number,
): SectionShape[] {
  const axis = line.map(([east, north]): SpacePoint => [east, north, 0]);
  try {
    const at = placeBeside(axis, chainages(axis), chainage);
    const [left, right] = [at(halfWidth), at(-halfWidth)];
    const [east, north] = [left[0] - right[0], left[1] - right[1]].map((part) => part * (END / 2));
    const strokes = [left, right].map(([e, n]): SectionShape => ({
      kind: 'mark',
      places: [
        [e - (north ?? 0), n + (east ?? 0)],
        [e + (north ?? 0), n - (east ?? 0)],
      ],
    }));
    return [
      { kind: 'mark', places: [left, right] },
      ...strokes,
      { kind: 'name', place: right, text: `Section ${chainageWords(chainage)}` },
    ];
  } catch (error) {
    if (error instanceof MethodError) return [];
    throw error;
  }
}
