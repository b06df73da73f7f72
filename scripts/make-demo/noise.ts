import { mix } from './prng.ts';

function corner(x: number, y: number, seed: number): number {
  return mix(Math.imul(x, 0x27d4eb2d) ^ Math.imul(y, 0x165667b1) ^ seed) / 2147483648 - 1;
}

function smooth(t: number): number {
  return t * t * t * (t * (t * 6 - 15) + 10);
}

/** Smooth noise from −1 to 1 that takes about `wave` metres from one hill to the next. */
export function noise(x: number, y: number, wave: number, seed: number): number {
  const [u, v] = [(2 * x) / wave, (2 * y) / wave];
  const [i, j] = [Math.floor(u), Math.floor(v)];
  const [s, t] = [smooth(u - i), smooth(v - j)];
  const low = corner(i, j, seed) * (1 - s) + corner(i + 1, j, seed) * s;
  const high = corner(i, j + 1, seed) * (1 - s) + corner(i + 1, j + 1, seed) * s;
  return low * (1 - t) + high * t;
}
