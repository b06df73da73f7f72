import { formatCount } from '../../../../shared/presentation/format-number.ts';
import { roundStep } from './round-step.ts';

export type ScaleBarLength = {
  readonly metres: number;
  readonly pixels: number;
  /** What stands at the start, the middle and the end. */
  readonly figures: readonly [string, string, string];
};

/** The longest round length that a scale bar of so many pixels holds. */
export function scaleBarLength(metresPerPixel: number, mostPixels: number): ScaleBarLength {
  const metres = roundStep(metresPerPixel * mostPixels);
  const [divisor, unit] = metres >= 2000 ? [1000, 'km'] : [1, 'm'];
  const end = metres / divisor;
  return {
    metres,
    pixels: metres / metresPerPixel,
    figures: ['0', formatCount(end / 2), `${formatCount(end)} ${unit}`],
  };
}
