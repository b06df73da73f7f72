import { CATEGORIES, type Category } from '../damage/categories.ts';
import { usesTroughWidthParameter } from '../ground/trough-width-rule.ts';
import type { Range } from '../numerics/range.ts';
import type { WorkingLine } from '../working.ts';
import type { SampledGround } from './sampled-grounds.ts';
import {
  mostGoverning,
  sampleAtShare,
  sampledRun,
  shareInCategory,
  type SampledRun,
} from './sampled-run.ts';
import { sensitivityOf, type Sensitivity } from './sensitivity.ts';
import type { BuildingSheet } from './sheet-of-building.ts';
import { workingOfSample } from './working-of-sample.ts';
import type { WorkingSection } from './working-of-wall.ts';

/**
 * The strain that a share of the samples does not pass, with the working of the sample that has it.
 *
 * Units: strain m/m. Valid: made by `openSamples`; share 1 is the largest of all. Source: [own].
 */
export type SampledStrain = {
  readonly share: number;
  readonly strain: number;
  readonly working: readonly WorkingSection[];
};

/**
 * All that there is to see of a sampled run: how many samples, from which ranges, how they spread over
 * the categories and in strain, which wall governs most of them, and whether bracket and samples
 * together are settled.
 *
 * Units: as the parts. Valid: made by `openSamples`; `grounds` are those that reach a wall of the
 * building. Source: the parts cite theirs.
 */
export type OpenedSamples = {
  readonly seed: number;
  readonly n: number;
  readonly grounds: readonly SampledGround[];
  /** Whether the depth rule has K for an input at all. */
  readonly drawsTroughWidth: boolean;
  readonly eOverG: Range;
  readonly categories: readonly {
    readonly category: Category;
    readonly count: number;
    readonly share: number;
    readonly working: readonly WorkingLine[];
  }[];
  readonly strains: readonly SampledStrain[];
  readonly governing: { readonly wall: string; readonly samples: number } | null;
  readonly sensitivity: Sensitivity;
};

/** The shares at which the strain is told. */
const SHARES = [0.05, 0.5, 0.95, 1];

function categoriesOf(run: SampledRun): OpenedSamples['categories'] {
  return CATEGORIES.map(({ category }) => {
    const working: WorkingLine[] = [];
    const share = shareInCategory(run, category, (line) => {
      working.push(line);
    });
    return { category, count: run.counts[category] ?? 0, share, working };
  });
}

/** Those that reach a wall of the building. */
function groundsOf({ fields }: SampledRun): SampledGround[] {
  const reaching = fields
    .flatMap(({ grounds }) => grounds)
    .filter(({ halves }) => halves.length > 0);
  const grounds = new Set(reaching.map(({ ground }) => ground));
  return [...grounds].sort((a, b) => a.number - b.number);
}

/**
 * Draws the samples of a building's sheet and opens them up. Nothing that a run records changes by it.
 *
 * Units: as OpenedSamples. Valid: seed as `randomShares`; null where the building has no strain stage that
 * could be worked out. Source: mckay-beckman-conover-1979, burland-1995.
 */
export function openSamples({ inputs, strain }: BuildingSheet, seed: number): OpenedSamples | null {
  const [first] = strain?.walls ?? [];
  if (strain?.bracket === undefined || first === undefined) return null;
  const { model, rules } = inputs;
  const walls = strain.walls.map(({ wall }) => wall);
  const run = sampledRun(model, walls, rules, [], seed);
  const governing = mostGoverning(run);
  return {
    seed,
    n: run.strains.length,
    grounds: groundsOf(run),
    drawsTroughWidth: rules.depth.kind === 'layered' || usesTroughWidthParameter(rules.depth),
    eOverG: first.wall.eOverG,
    categories: categoriesOf(run),
    strains: SHARES.map((share) => {
      const sample = sampleAtShare(run, share);
      return {
        share,
        strain: run.strains[sample] ?? 0,
        working: workingOfSample(model, rules, [], run, sample),
      };
    }),
    governing:
      governing === null
        ? null
        : { wall: walls[governing.wall]?.name ?? '', samples: governing.samples },
    sensitivity: sensitivityOf(strain.bracket, run.strains),
  };
}
