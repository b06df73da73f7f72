import type { Random } from './prng.ts';
import { rectangle } from './vector.ts';
import type { Ring } from './vector.ts';

/** Shapes are drawn about the origin, long side along x, counter-clockwise, in metres. */
export function slab(long: number, short: number): Ring {
  return rectangle([0, 0], [1, 0], long, short);
}

function elShape(long: number, short: number, thick: number): Ring {
  const [u, v] = [long / 2, short / 2];
  return [[-u, -v], [u, -v], [u, -v + thick], [-u + thick, -v + thick], [-u + thick, v], [-u, v]]; // prettier-ignore
}

export function youShape(long: number, short: number, thick: number): Ring {
  const [u, v] = [long / 2, short / 2];
  return [
    [-u, -v], [u, -v], [u, v], [u - thick, v], [u - thick, -v + thick], [-u + thick, -v + thick], [-u + thick, v], [-u, v],
  ]; // prettier-ignore
}

export function teeShape(long: number, short: number, thick: number): Ring {
  const [u, v, t] = [long / 2, short / 2, thick / 2];
  return [[-u, -v], [u, -v], [u, -v + thick], [t, -v + thick], [t, v], [-t, v], [-t, -v + thick], [-u, -v + thick]]; // prettier-ignore
}

export function combShape(long: number, short: number, thick: number): Ring {
  const [u, v, t] = [long / 2, short / 2, thick];
  return [
    [-u, -v], [u, -v], [u, v], [u - t, v], [u - t, -v + t], [t / 2, -v + t], [t / 2, v * 0.7], [-t / 2, v * 0.7], [-t / 2, -v + t],
    [-u + t, -v + t], [-u + t, v], [-u, v],
  ]; // prettier-ignore
}

/** A tower of flats: a square with its corners cut back. */
export function notchedTower(side: number): Ring {
  const [u, n] = [side / 2, side * 0.18];
  return [
    [-u + n, -u], [u - n, -u], [u - n, -u + n], [u, -u + n], [u, u - n], [u - n, u - n], [u - n, u], [-u + n, u], [-u + n, u - n],
    [-u, u - n], [-u, -u + n], [-u + n, -u + n],
  ]; // prettier-ignore
}

/** Tower, nave, transepts and a chancel with a many-sided end, west to east. */
export function churchShape(): Ring {
  return [
    [-26, -4.6], [-17, -4.6], [-17, -7], [3, -7], [3, -11], [10.5, -11], [10.5, -5], [20, -5], [24, -2.4], [24, 2.4], [20, 5], [10.5, 5],
    [10.5, 11], [3, 11], [3, 7], [-9, 7], [-9, 10.2], [-13.5, 10.2], [-13.5, 7], [-17, 7], [-17, 4.6], [-26, 4.6],
  ]; // prettier-ignore
}

/** A square house with a portico to the water and a shallow bay behind. */
export function customsShape(): Ring {
  return [
    [-13, -8.5], [-4.5, -8.5], [-4.5, -11], [4.5, -11], [4.5, -8.5], [13, -8.5], [13, 8.5], [5.5, 8.5], [5.5, 10], [-5.5, 10],
    [-5.5, 8.5], [-13, 8.5],
  ]; // prettier-ignore
}

export function officeShape(long: number, short: number, random: Random): Ring {
  const thick = Math.min(16, Math.max(10, short * 0.36));
  if (short < thick * 1.9) return slab(long, short);
  const draw = random.pick([elShape, youShape, teeShape, slab, youShape]);
  return draw(long, short, thick);
}
