/** A point of a drive's axis. */
export type AxisPoint = { readonly E: number; readonly N: number; readonly level: number };

/**
 * The axis of a drive as a curve by its plan length; between neighbouring breaks it is smooth.
 */
export type SinkPath = {
  readonly length: number;
  readonly breaks: readonly number[];
  readonly at: (s: number) => AxisPoint;
};

/** A polyline of easting, northing and level. */
export function pathAlong(vertices: readonly (readonly [number, number, number])[]): SinkPath {
  const legs: { from: number; to: number; at: (s: number) => AxisPoint }[] = [];
  let from = 0;
  for (const [k, [E0, N0, level0]] of vertices.entries()) {
    const next = vertices[k + 1];
    if (next === undefined) break;
    const [E1, N1, level1] = next;
    const [start, length] = [from, Math.hypot(E1 - E0, N1 - N0)];
    legs.push({
      from: start,
      to: start + length,
      at: (s) => {
        const t = (s - start) / length;
        return {
          E: E0 + t * (E1 - E0),
          N: N0 + t * (N1 - N0),
          level: level0 + t * (level1 - level0),
        };
      },
    });
    from += length;
  }
  return {
    length: from,
    breaks: [0, ...legs.map((leg) => leg.to)],
    at: (s) => {
      const leg = legs.find(({ to }) => s < to) ?? legs.at(-1);
      if (leg === undefined) throw new Error('A path needs at least two vertices.');
      return leg.at(s);
    },
  };
}

/** An arc in plan, anticlockwise round (E, N) from a bearing against east, on an even gradient. */
export type ArcShape = {
  readonly E: number;
  readonly N: number;
  readonly radius: number;
  readonly fromAngle: number;
  readonly toAngle: number;
  readonly fromLevel: number;
  readonly toLevel: number;
};

/** The arc itself, not its chords. */
export function pathRound(arc: ArcShape): SinkPath {
  const { E, N, radius, fromAngle, toAngle, fromLevel, toLevel } = arc;
  const length = radius * (toAngle - fromAngle);
  return {
    length,
    breaks: [0, length],
    at: (s) => {
      const angle = fromAngle + s / radius;
      return {
        E: E + radius * Math.cos(angle),
        N: N + radius * Math.sin(angle),
        level: fromLevel + ((toLevel - fromLevel) * s) / length,
      };
    },
  };
}

/** An arc as chords of equal length, no longer than `longest`: what a drive's axis is given as. */
export function chordsOf(arc: ArcShape, longest: number): [number, number, number][] {
  const path = pathRound(arc);
  const chords = Math.ceil(path.length / longest);
  return Array.from({ length: chords + 1 }, (_, k) => {
    const { E, N, level } = path.at((k * path.length) / chords);
    return [E, N, level];
  });
}
