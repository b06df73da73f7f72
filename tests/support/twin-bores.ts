import type { Wall } from '../../shared/building/wall.ts';
import type { Drive } from '../../shared/ground/drive.ts';
import { bendOf } from './arcs.ts';
import { aDrive, aWall } from './builders.ts';
import { chordsOf } from './sink-path.ts';

const RADIUS = 300;

/** Two bores side by side in a bend, 16 m apart, the outer one deeper and driven later. */
export function twinBores(gradient: number, overrides: Partial<Drive> = {}): Drive[] {
  const inner = bendOf(RADIUS, gradient);
  const { toLevel } = inner;
  const outer = { ...inner, radius: RADIUS + 16, fromLevel: -22, toLevel: toLevel - 2 };
  return [
    aDrive({ axis: chordsOf(inner, 5), ...overrides }),
    aDrive({ name: 'B', axis: chordsOf(outer, 5), laterFactor: 1.2, ...overrides }),
  ];
}

/** The share 0 to 1 that the k-th of many walls takes of a range; irrational, so that all differ. */
function share(k: number, step: number): number {
  return (k * step) % 1;
}

/** The k-th of many walls about the twin bores: 4 to 50 m long, at every angle, 1 to 4 m deep. */
export function wallAboutBores(k: number): Wall {
  const angle = 0.5 + 1.2 * share(k, 0.618034);
  const radius = RADIUS - 40 + 96 * share(k, 0.7548777);
  const [E, N] = [radius * Math.cos(angle), radius * Math.sin(angle)];
  const turn = Math.PI * share(k, 0.5698403);
  const half = (4 + 46 * share(k, 0.4142136)) / 2;
  const [dE, dN] = [half * Math.cos(turn), half * Math.sin(turn)];
  return aWall({
    name: `wall ${k}`,
    from: [E - dE, N - dN],
    to: [E + dE, N + dN],
    foundingLevel: -1 - 3 * share(k, 0.302776),
    height: 6 + 9 * share(k, 0.236068),
  });
}
