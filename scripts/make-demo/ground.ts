import { noise } from './noise.ts';
import type { Terrain } from './terrain.ts';
import { distance } from './vector.ts';
import type { Point } from './vector.ts';

const hill: Point = [905, 650];
const quayLevel = 3;

function rise(off: number, over: number): number {
  const share = Math.min(1, Math.max(0, off / over));
  return share * share * (3 - 2 * share);
}

/** Level of the ground above the scheme datum: 3 m on the quays, about 12 m on the hill. */
export function levelAt(at: Point, terrain: Terrain, seed: number): number {
  const inland = Math.min(terrain.toQuay(at) - 12, terrain.toShore(at) - 10);
  const away = distance(at, hill) / 210;
  const swell =
    noise(at[0], at[1], 420, seed + 21) * 0.55 + noise(at[0], at[1], 130, seed + 22) * 0.18;
  const gentle = rise(inland, 240);
  return (
    quayLevel + 3.7 * gentle + 6.1 * Math.exp(-away * away) * rise(inland, 120) + swell * gentle
  );
}
