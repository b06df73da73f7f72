import { planDistance } from '../geometry/plan-distance.ts';
import { sine } from '../numerics/sine.ts';
import type { Facade } from './facade.ts';
import type { RowTolerance } from './row-tolerance.ts';

/**
 * One end of a façade.
 *
 * Units: none. Valid: any façade. Source: [own].
 */
export type FacadeEnd = { readonly facade: Facade; readonly side: 'start' | 'end' };

/**
 * Two façades that go on as one another: which of their ends meet, how far apart those are, to a
 * millimetre, and the sine of the turn between them, to a millionth; so that ties are ties however
 * coordinates round.
 *
 * Units: gap mm, turn 1e-6. Valid: made by `facadeLinks`. Source: [own].
 */
export type FacadeLink = {
  readonly gap: number;
  readonly turn: number;
  readonly ends: readonly [FacadeEnd, FacadeEnd];
};

const SIDES = ['start', 'end'] as const;

/**
 * The ways in which one façade goes on as another: two ends within `offset` of each other, the
 * façades on opposite sides of the joint and turning there by no more than twice the `angle` that
 * each may have with a row.
 *
 * Units: m. Valid: two different façades. Source: [own].
 */
export function facadeLinks(a: Facade, b: Facade, { angle, offset }: RowTolerance): FacadeLink[] {
  const sineOfTurn = Math.abs(a.direction[0] * b.direction[1] - a.direction[1] * b.direction[0]);
  if (sineOfTurn > sine(2 * angle)) return [];
  const sameWay = a.direction[0] * b.direction[0] + a.direction[1] * b.direction[1] > 0;
  const links: FacadeLink[] = [];
  for (const side of SIDES) {
    const other = (side === 'start') === sameWay ? 'end' : 'start';
    const distance = planDistance(a[side], b[other]);
    if (distance > offset) continue;
    links.push({
      gap: Math.round(distance * 1e3),
      turn: Math.round(sineOfTurn * 1e6),
      ends: [
        { facade: a, side },
        { facade: b, side: other },
      ],
    });
  }
  return links;
}
