import type { GroundAnswer } from '../../../shared/schemas/ground.ts';
import { formatCount } from '../../../shared/presentation/format-number.ts';

type Ground = NonNullable<GroundAnswer['ground']>;

/** What a scheme's ground is made of. */
export function kindWords({ kind, points }: Ground): string {
  if (kind === 'level') return 'one level for all';
  const unit = kind === 'spots' ? 'spot heights' : 'cells of a grid';
  return `${formatCount(points)} ${unit}`;
}

/** Between which levels it lies. */
export function rangeWords({ lowest, highest }: Ground): string {
  if (lowest === highest) return `${formatCount(lowest)} m`;
  return `${formatCount(lowest)} to ${formatCount(highest)} m`;
}

function buildings(count: number): string {
  return `${formatCount(count)} ${count === 1 ? 'building' : 'buildings'}`;
}

/** Where buildings have their ground level from, with how many; what is nought is left out. */
export function levelFacts(
  counts: GroundAnswer['buildings'],
): readonly (readonly [word: string, count: string])[] {
  const facts: readonly (readonly [string, number])[] = [
    ['Take it from here', counts.fromGround],
    ['From their file', counts.fromFile],
    ['By hand', counts.byHand],
    ['Have none', counts.unknown],
  ];
  return facts.filter(([, count]) => count > 0).map(([word, count]) => [word, buildings(count)]);
}
