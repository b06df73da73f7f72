/** A point or a direction in plan, metres. */
export type Point = readonly [number, number];
/** A closed line given without repeating its first point; outer rings run counter-clockwise. */
export type Ring = readonly Point[];
/** An open line. */
export type Line = readonly Point[];
/** A ring with the holes in it. */

export function add(a: Point, b: Point): Point {
  return [a[0] + b[0], a[1] + b[1]];
}

export function subtract(a: Point, b: Point): Point {
  return [a[0] - b[0], a[1] - b[1]];
}

export function scale(a: Point, factor: number): Point {
  return [a[0] * factor, a[1] * factor];
}

/** The point reached from `from` by going `distance` along `direction`. */
export function along(from: Point, direction: Point, distance: number): Point {
  return [from[0] + direction[0] * distance, from[1] + direction[1] * distance];
}

export function dot(a: Point, b: Point): number {
  return a[0] * b[0] + a[1] * b[1];
}

export function cross(a: Point, b: Point): number {
  return a[0] * b[1] - a[1] * b[0];
}

export function length(a: Point): number {
  return Math.sqrt(a[0] * a[0] + a[1] * a[1]);
}

export function distance(a: Point, b: Point): number {
  return length(subtract(a, b));
}

export function unit(a: Point): Point {
  const size = length(a);
  return size === 0 ? [1, 0] : [a[0] / size, a[1] / size];
}

export function direction(from: Point, to: Point): Point {
  return unit(subtract(to, from));
}

/** A quarter turn to the left. */
export function left(a: Point): Point {
  return [-a[1], a[0]];
}

export function fromAngle(radians: number): Point {
  return [Math.cos(radians), Math.sin(radians)];
}

export function angleOf(a: Point): number {
  return Math.atan2(a[1], a[0]);
}

export function between(a: Point, b: Point, share: number): Point {
  return [a[0] + (b[0] - a[0]) * share, a[1] + (b[1] - a[1]) * share];
}

/** Item `index` of a ring, counted round and round in either direction. */
export function cyclic<T>(items: readonly T[], index: number): T {
  const count = items.length;
  const item = items[((index % count) + count) % count];
  if (item === undefined) throw new Error('An empty ring has no items.');
  return item;
}

/** Item `index` of a list that is known to hold it. */
export function itemAt<T>(items: readonly T[], index: number): T {
  const item = items[index];
  if (item === undefined) throw new Error(`No item ${index} of ${items.length}.`);
  return item;
}

/** A rectangle about a centre, its long side along `axis`, counter-clockwise. */
export function rectangle(centre: Point, axis: Point, long: number, short: number): Ring {
  const side = left(axis);
  function corner(u: number, v: number): Point {
    return along(along(centre, axis, (u * long) / 2), side, (v * short) / 2);
  }
  return [corner(-1, -1), corner(1, -1), corner(1, 1), corner(-1, 1)];
}

/** Takes a shape drawn about the origin to `centre`, its x axis turned to `axis`. */
export function place(shape: Ring, centre: Point, axis: Point): Ring {
  const side = left(axis);
  return shape.map(([u, v]) => along(along(centre, axis, u), side, v));
}
