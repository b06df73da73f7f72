import type { Wing } from './houses.ts';
import type { Random } from './prng.ts';
import { fill } from './row-styles.ts';
import type { RowStyle } from './rows.ts';

/** Pairs of houses and single ones, each in its garden. */
export function villaRow(random: Random): RowStyle {
  const [width, depth] = [random.range(6.4, 7.6), random.range(8.2, 9.8)];
  const paired = random.chance(0.62);
  const gap = { width: random.range(3.4, 5.6), open: true };
  const house = { width, open: false };
  const single = { width: width * 1.5, open: false };
  return {
    label: 'villas',
    rule: {
      depth: depth * 0.9,
      cornerExtra: 0,
      widths: (run) => [
        gap,
        ...fill(run, () => (paired && random.chance(0.86) ? [house, house, gap] : [single, gap])),
      ],
    },
    depth: () => depth + random.range(-0.4, 0.4),
    court: 5,
    leastDepth: 6.5,
    wing: (_plot, place): Wing | null =>
      random.chance(0.6)
        ? {
            side: place % 2 === 0 ? 'to' : 'from',
            width: random.range(3, 3.8),
            length: random.range(2.2, 3.8),
          }
        : null,
    kind: (plot) =>
      plot.to.station - plot.from.station > width * 1.25 || plot.corner !== null
        ? 'detached house'
        : 'semi-detached house',
  };
}

/** Deep stores with their gables to the quay. */
export function warehouseRow(random: Random): RowStyle {
  const base = random.range(17, 24);
  return {
    label: 'stores',
    rule: {
      depth: base,
      cornerExtra: 3,
      widths: (run) =>
        fill(run, () =>
          random.chance(0.16)
            ? [{ width: 4.5, open: true }]
            : [{ width: random.range(8.5, 21), open: false }],
        ),
    },
    depth: () => base * random.range(0.72, 1.3),
    court: 0.8,
    leastDepth: 8,
    wing: (): Wing | null => null,
    kind: () => (random.chance(0.84) ? 'warehouse' : 'net loft'),
  };
}

/** Tall blocks of flats built round their yards, a few to a street. */
export function courtyardRow(random: Random): RowStyle {
  const base = random.range(10.5, 13);
  return {
    label: 'court',
    rule: {
      depth: base,
      cornerExtra: 9,
      widths: (run) => fill(run, () => [{ width: random.range(15, 27), open: false }]),
    },
    depth: () => base,
    court: 2,
    leastDepth: 7,
    wing: (_plot, place): Wing | null =>
      random.chance(0.4)
        ? { side: place % 2 === 0 ? 'to' : 'from', width: 6.5, length: random.range(4, 10) }
        : null,
    kind: () => (random.chance(0.8) ? 'courtyard block' : 'office'),
  };
}
