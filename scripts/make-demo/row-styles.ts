import type { Kind } from './footprints.ts';
import type { Wing } from './houses.ts';
import type { Random } from './prng.ts';
import type { Plot } from './row-plan.ts';
import type { RowStyle } from './rows.ts';
import type { Point } from './vector.ts';

/** What a row needs to know of the street before it. */
export type StreetSense = { readonly isBusy: (front: Point) => boolean };

type Width = { readonly width: number; readonly open: boolean };

/** Draws plot after plot until a run is full. */
export function fill(run: number, draw: () => readonly Width[]): Width[] {
  const widths: Width[] = [];
  let sum = 0;
  while (sum < run) {
    const next = draw();
    widths.push(...next);
    sum += next.reduce((total, { width }) => total + width, 0);
  }
  const last = widths.at(-1);
  const over = sum - run;
  return last !== undefined && widths.length > 1 && over > last.width / 2
    ? widths.slice(0, -1)
    : widths;
}

function middle(plot: Plot): Point {
  return [(plot.from.at[0] + plot.to.at[0]) / 2, (plot.from.at[1] + plot.to.at[1]) / 2];
}

function trade(plot: Plot, sense: StreetSense, house: Kind, random: Random): Kind {
  if (plot.corner !== null)
    return random.weighted([
      ['public house', 0.3],
      ['shop', 0.45],
      [house, 0.4],
    ]);
  return random.chance(sense.isBusy(middle(plot)) ? 0.62 : 0.1) ? 'shop' : house;
}

/** Narrow, deep, uneven plots: no two houses of the old town were built in the same year. */
export function oldTownRow(sense: StreetSense, random: Random): RowStyle {
  const base = random.range(8.6, 11.6);
  return {
    label: 'old',
    rule: {
      depth: base,
      cornerExtra: 5,
      widths: (run) =>
        fill(run, () =>
          random.chance(0.05)
            ? [{ width: 2.4, open: true }]
            : [{ width: random.range(5.1, 9.2), open: false }],
        ),
    },
    depth: () => base + random.range(-2.2, 3.6),
    court: 0.6,
    leastDepth: 4.2,
    wing: (_plot, place): Wing | null =>
      random.chance(0.48)
        ? {
            side: place % 2 === 0 ? 'to' : 'from',
            width: random.range(2.6, 4.4),
            length: random.range(3, 9),
          }
        : null,
    kind: (plot) =>
      trade(plot, sense, random.chance(0.2) ? 'town house' : 'terraced house', random),
  };
}

/** Brick terraces: every house of a run alike, back wings in pairs. */
export function terraceRow(sense: StreetSense, random: Random): RowStyle {
  const [width, depth] = [random.range(5.1, 6.7), random.range(8, 9.6)];
  const wing = { width: width * random.range(0.44, 0.54), length: random.range(3.6, 5.6) };
  const hasWings = random.chance(0.82);
  return {
    label: 'terrace',
    rule: {
      depth,
      cornerExtra: 3.5,
      widths: (run) => {
        const count = Math.max(1, Math.round(run / width));
        const passage = count > 9 ? Math.floor(count / 2) : -1;
        return Array.from({ length: count }, (_, at) =>
          at === passage ? { width: 2.2, open: true } : { width, open: false },
        );
      },
    },
    depth: () => depth,
    court: 2.4,
    leastDepth: 5.4,
    wing: (_plot, place) => (hasWings ? { side: place % 2 === 0 ? 'to' : 'from', ...wing } : null),
    kind: (plot) => trade(plot, sense, 'terraced house', random),
  };
}
