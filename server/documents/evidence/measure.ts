import type { Measure } from '../../../shared/evidence/marks.ts';
import { POINTS_PER_MM } from '../pdf/page-sizes.ts';
import type { Paper } from '../pdf/paper.ts';
import { lineOf } from '../pdf/words.ts';

/** How wide words are on a document's paper. */
export function openMeasure(paper: Paper): Measure {
  return (words, size, isStrong) =>
    lineOf(paper, words, { size, weight: isStrong ? 'strong' : 'regular' }).width / POINTS_PER_MM;
}
