/**
 * A straight way from values to places on a drawing.
 *
 * Units: as its spans. Valid: made by `linearScale`. Source: [own].
 */
export type Scale = (value: number) => number;

type Span = readonly [number, number];

/**
 * The scale that takes the ends of a span of values to the ends of a span of pixels.
 *
 * Units: as the spans. Valid: a span of values without length goes to the start. Source: [own].
 */
export function linearScale([from, to]: Span, [start, end]: Span): Scale {
  const perUnit = from === to ? 0 : (end - start) / (to - from);
  return (value) => start + (value - from) * perUnit;
}
