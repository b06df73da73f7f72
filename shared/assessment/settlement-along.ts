import { chainages } from '../geometry/chainages.ts';
import { pointAtChainage } from '../geometry/point-at-chainage.ts';
import type { SpacePoint } from '../geometry/point.ts';
import type { GroundRules } from '../ground/ground-model.ts';
import { at } from '../numerics/at.ts';
import type { Range } from '../numerics/range.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';
import { settlementBracket } from './settlement-bracket.ts';

/**
 * Settlement of the surface on a designed line at one chainage, over the bracket.
 *
 * Units: m. Valid: made by `settlementAlong`; null where the method refuses. Source: as
 * `settlementBracket`.
 */
export type SettlementOnLine = { readonly chainage: number; readonly settlement: Range | null };

/**
 * Settlement of the surface along a designed line, from its first point to its last in equal steps. Of
 * twin bores it is that of both, between them.
 *
 * Units: m. Valid: at least one step; throws as `drivesOfDesign`. Source: as `settlementBracket`.
 */
export function settlementAlong(
  design: AlignmentDesign,
  rules: GroundRules,
  steps: number,
): SettlementOnLine[] {
  const bracket = settlementBracket(design, rules);
  const line = design.line.map(([e, n]): SpacePoint => [e, n, 0]);
  const stations = chainages(line);
  const end = at(stations, stations.length - 1);
  return Array.from({ length: steps + 1 }, (_, k) => {
    const chainage = (k * end) / steps;
    const [e, n] = pointAtChainage(line, stations, chainage);
    return { chainage, settlement: bracket.at([e, n]) };
  });
}
