import { CONTOUR_LEVELS } from '../../../shared/ground/settlement-contours.ts';
import type { RegisterFilter } from '../../../shared/schemas/register.ts';
import { RESULT_VALUES } from '../../../shared/schemas/result-values.ts';
import { FIRST_SHADE } from '../map/shades.ts';
import type { End, Shading } from './shades-of-run.ts';

const COLUMN_OF_END = { low: 'categoryLow', central: 'category', high: 'categoryHigh' } as const;

/**
 * The buildings of the register that take a colour. A range holds both its ends, where a band of the map
 * begins with the lower one only: a figure that is a level to the last digit stands in two ranges.
 */
export function foundAsShaded(
  by: Shading['by'],
  end: End,
  shade: number,
): Pick<RegisterFilter, 'any' | 'ranges'> {
  const number = shade - FIRST_SHADE[by];
  if (by === 'category') return { any: { [COLUMN_OF_END[end]]: [String(number)] } };
  if (by === 'stage') return { any: { stage: [String(number)] } };
  const { scale } = RESULT_VALUES.settlement;
  const [from = 0, to] = [CONTOUR_LEVELS[number], CONTOUR_LEVELS[number + 1]];
  return {
    ranges: {
      settlement: {
        from: from * scale,
        ...(to !== undefined && { to: to * scale }),
      },
    },
  };
}
