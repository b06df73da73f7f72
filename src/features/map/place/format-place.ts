import { formatCount } from '../../../../shared/presentation/format-number.ts';
import type { GridPlace } from './grid-projection.ts';

function figure(value: number): string {
  const tenths = Math.round(value * 10);
  const [whole, tenth] = [Math.trunc(tenths / 10), Math.abs(tenths % 10)];
  const sign = tenths < 0 && whole === 0 ? '\u2212' : '';
  return `${sign}${formatCount(whole)}.${tenth}`;
}

/** A place of the grid as people read it: decimetres, digits in threes. */
export function formatPlace([easting, northing]: GridPlace): readonly [
  east: string,
  north: string,
] {
  return [`E ${figure(easting)}`, `N ${figure(northing)}`];
}
