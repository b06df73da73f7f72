import type { AssessCase } from '../../shared/schemas/assess-case.ts';
import { seededRandom } from './seeded-random.ts';

const RADIUS = 800;
const CHORD = 5;
const CHORDS = 120;
const APART = 14;
const WIDEST_OFFSET = 60;

/** A point on the curve, `offset` to its left, in a grid far from its origin. */
function onCurve(chainage: number, offset: number): [number, number] {
  const angle = chainage / RADIUS;
  const reach = RADIUS - offset;
  return [412_000 + reach * Math.sin(angle), 6_068_000 + RADIUS - reach * Math.cos(angle)];
}

/**
 * Walls at random places and angles within 60 m of a curved twin bore of 600 m on a gradient, given as
 * 5 m chords; with ranges of volume loss and K for the bracket.
 */
export function twinBoreCase(walls: number, ranges: boolean): AssessCase {
  const random = seededRandom(7);
  const bore = (name: string, offset: number): AssessCase['drives'][number] => ({
    name,
    axis: Array.from({ length: CHORDS + 1 }, (_, k) => [
      ...onCurve(k * CHORD, offset),
      -18 - 0.02 * k * CHORD,
    ]),
    diameter: 6.6,
    volumeLoss: ranges ? [0.008, 0.014, 0.02] : 0.014,
    troughWidth: ranges ? [0.4, 0.48, 0.56] : 0.48,
  });
  return {
    groundLevel: 6,
    drives: [bore('up', APART / 2), bore('down', -APART / 2)],
    walls: Array.from({ length: walls }, (_, index) => {
      const from = onCurve(random() * CHORD * CHORDS, (random() - 0.5) * 2 * WIDEST_OFFSET);
      const angle = random() * 2 * Math.PI;
      const length = 4 + random() * 26;
      return {
        name: `W${index + 1}`,
        from,
        to: [from[0] + length * Math.cos(angle), from[1] + length * Math.sin(angle)],
        foundingLevel: 4 + random() * 1.5,
        height: 6 + random() * 9,
        eOverG: 2.6,
        poisson: 0.3,
      };
    }),
  };
}
