import type { Range } from '../numerics/range.ts';
import type { AlignmentDesign } from '../schemas/alignments.ts';

/**
 * The most volume loss that is allowed along a stretch of the line.
 *
 * Units: volumeLoss m/m, chainages m along the drawn line. Valid: from below to. Source: [own].
 */
export type LossLimit = {
  readonly volumeLoss: number;
  readonly from: number;
  readonly to: number;
};

type Interval = AlignmentDesign['intervals'][number];

function limited({ low, central, high }: Range, most: number): Interval['volumeLoss'] {
  return { low: Math.min(low, most), central: Math.min(central, most), high: Math.min(high, most) };
}

/** The stretches between intervals, with the values of the whole line. */
function gapsOf(design: AlignmentDesign, { from, to }: LossLimit): Interval[] {
  const { volumeLoss, troughWidth, intervals } = design;
  const ends = [from, ...intervals.map((interval) => interval.to)];
  const starts = [...intervals.map((interval) => interval.from), to];
  return ends.flatMap((end, k) => {
    const [start, stop] = [Math.max(end, from), Math.min(starts[k] ?? to, to)];
    return start < stop ? [{ from: start, to: stop, volumeLoss, troughWidth }] : [];
  });
}

/** An interval cut where the limit begins and ends. */
function cutAt(interval: Interval, { from, to }: LossLimit): Interval[] {
  const cuts = [interval.from, from, to, interval.to]
    .filter((cut) => cut >= interval.from && cut <= interval.to)
    .sort((a, b) => a - b);
  return cuts.flatMap((cut, k) => {
    const next = cuts[k + 1];
    return next === undefined || next <= cut ? [] : [{ ...interval, from: cut, to: next }];
  });
}

/**
 * A design whose volume loss is kept to a limit along a stretch of the line, low, central and high: what a
 * protective measure at the tunnel promises.
 *
 * Units: as AlignmentDesign and LossLimit. Valid: what lies below the limit stays as it is. Source: [own];
 * protection is sought first in how the tunnel is driven, burland-1995.
 */
export function limitedDesign(design: AlignmentDesign, limit: LossLimit): AlignmentDesign {
  const pieces = [
    ...design.intervals.flatMap((one) => cutAt(one, limit)),
    ...gapsOf(design, limit),
  ];
  const intervals = pieces.map((piece) => {
    const isWithin = piece.from >= limit.from && piece.to <= limit.to;
    return isWithin ? { ...piece, volumeLoss: limited(piece.volumeLoss, limit.volumeLoss) } : piece;
  });
  return { ...design, intervals: intervals.sort((a, b) => a.from - b.from) };
}
