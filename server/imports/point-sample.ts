type Point = readonly [number, number];

/** Every so many-th point of a row of any length, at most twice as many as wanted. */
export function createPointSample(wanted = 200) {
  let [points, step, count]: [Point[], number, number] = [[], 1, 0];
  return {
    add: (point: Point): void => {
      if (count % step === 0) points.push(point);
      count += 1;
      if (points.length < 2 * wanted) return;
      points = points.filter((_, index) => index % 2 === 0);
      step *= 2;
    },
    points: (): readonly Point[] => points,
  };
}
