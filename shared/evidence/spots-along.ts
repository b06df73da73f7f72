import { planDistance } from '../geometry/plan-distance.ts';
import type { LabelBox } from './label-box.ts';
import type { Spot } from './marks.ts';

/** In mm: from one spot to the next, and how far a line may be from straight under a label. */
const [STEP, SAG] = [4, 0.7];

type Station = { readonly at: Spot; readonly distance: number };

/** Places on a line at even distances. */
function stationsOf(line: readonly Spot[], step: number): Station[] {
  const found: Station[] = [];
  let [passed, next] = [0, step / 2];
  for (const [k, to] of line.entries()) {
    const from = line[k - 1];
    if (from === undefined) continue;
    const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
    const long = planDistance(from, to);
    for (; next <= passed + long; next += step) {
      const share = (next - passed) / long;
      found.push({ at: [from[0] + share * dx, from[1] + share * dy], distance: next });
    }
    passed += long;
  }
  return found;
}

/** A direction that words can be read in: never from right to left. */
function readable([x, y]: Spot): Spot {
  const turned = x < -1e-9 || (Math.abs(x) <= 1e-9 && y > 0);
  return turned ? [-x, -y] : [x, y];
}

/**
 * Where words of a length may stand on a line, along it, where it is nearly straight. The line's length in
 * the middle of each spot comes with it.
 *
 * Units: mm. Valid: none on a line that is shorter than the words. Source: [own].
 */
export function spotsAlong(
  line: readonly Spot[],
  { wide, tall }: { readonly wide: number; readonly tall: number },
): { readonly box: LabelBox; readonly distance: number }[] {
  const stations = stationsOf(line, STEP);
  const reach = Math.max(1, Math.round(wide / 2 / STEP));
  return stations.flatMap(({ at, distance }, k) => {
    const [from, to] = [stations[k - reach], stations[k + reach]];
    if (from === undefined || to === undefined) return [];
    const [dx, dy] = [to.at[0] - from.at[0], to.at[1] - from.at[1]];
    const long = planDistance(from.at, to.at);
    const sag = Math.abs(dx * (at[1] - from.at[1]) - dy * (at[0] - from.at[0])) / long;
    if (!(sag <= SAG) || long < 2 * reach * STEP * 0.9) return [];
    const along = readable([dx / long, dy / long]);
    return [{ distance, box: { middle: at, halfWide: wide / 2, halfTall: tall / 2, along } }];
  });
}
