import fc from 'fast-check';
import type { LabelBox } from '../../shared/evidence/label-box.ts';
import type { Spot } from '../../shared/evidence/marks.ts';
import { numbers } from './property.ts';

/** An upright label, 10 mm long and 4 mm high, round a place. */
export function aLabelBox(middle: Spot): LabelBox {
  return { middle, halfWide: 5, halfTall: 2, along: [1, 0] };
}

const directions = fc.oneof(
  fc.constant<Spot>([1, 0]),
  numbers(-Math.PI / 2, Math.PI / 2).map((turn): Spot => [Math.cos(turn), Math.sin(turn)]),
);

/** Labels about a window of 120 by 90 mm, some of them beyond its sides, upright or askew. */
export const labelBoxes: fc.Arbitrary<LabelBox> = fc.record({
  middle: fc.tuple(numbers(-5, 125), numbers(-5, 95)),
  halfWide: numbers(0.5, 14),
  halfTall: numbers(0.5, 3),
  along: directions,
});

const SHARES = Array.from({ length: 13 }, (_, k) => (k - 6) / 6);

/** Places all over the ground of a label, to its very edges. */
export function spotsOf({ middle, halfWide, halfTall, along }: LabelBox): Spot[] {
  const [x, y] = middle;
  const [c, s] = along;
  return SHARES.flatMap((a) =>
    SHARES.map((b): Spot => {
      const [u, v] = [a * halfWide, b * halfTall];
      return [x + u * c - v * s, y + u * s + v * c];
    }),
  );
}

/** Whether a place lies inside of a label's ground, and not only on its edge. */
export function holdsSpot({ middle, halfWide, halfTall, along }: LabelBox, [x, y]: Spot): boolean {
  const [dx, dy] = [x - middle[0], y - middle[1]];
  const [c, s] = along;
  const slack = 1e-6;
  return (
    Math.abs(dx * c + dy * s) < halfWide - slack && Math.abs(dy * c - dx * s) < halfTall - slack
  );
}
