import type { PlanBuilding, PlanMaterial } from '../../shared/evidence/plan-material.ts';
import type { AboutSheets } from '../../shared/evidence/sheet.ts';
import type { TitleFields } from '../../shared/schemas/evidence.ts';
import { aPlan } from './evidence.ts';
import { aRing } from './register-facts.ts';
import { aRunDetail } from './run-answers.ts';

/** Words as wide as if all letters were alike: a little wider than those of print. */
export function evenMeasure(words: string, size: number, isStrong: boolean): number {
  return Array.from(words).length * size * (isStrong ? 0.2 : 0.19);
}

/** A building of a plan: unless said otherwise 10 by 8 m beside the line, of category 1. */
export function aPlanBuilding({
  result,
  ...known
}: Partial<Omit<PlanBuilding, 'result'>> & {
  readonly result?: Partial<PlanBuilding['result']>;
} = {}): PlanBuilding {
  return {
    ...{ id: '7', reference: 'B0007', address: '3 Cable Street', parts: [[aRing(-5, 2, 10, 8)]] },
    ...known,
    result: {
      ...{ stage: 3, categoryLow: 0, category: 1, categoryHigh: 2 },
      ...{ settlement: 0.012, strain: 0.0006, breakpointVolumeLoss: 0.021 },
      ...result,
    },
  };
}

/** Houses side by side from a place on towards east, so wide and so deep, with a category of 0 to 4 in turn. */
export function aRowOfHouses(
  count: number,
  { west, south, wide, deep }: Readonly<Record<'west' | 'south' | 'wide' | 'deep', number>>,
): PlanBuilding[] {
  return Array.from({ length: count }, (_, k) =>
    aPlanBuilding({
      ...{ id: String(k), reference: `R${k}`, address: `${k} Long Row` },
      parts: [[aRing(west + k * wide, south, wide, deep)]],
      result: { category: ([0, 1, 2, 3, 4] as const)[k % 5] ?? 0 },
    }),
  );
}

/** What a plan is drawn from: unless said otherwise one building and nothing else. */
export function aPlanMaterial(overrides: Partial<PlanMaterial> = {}): PlanMaterial {
  return { buildings: [aPlanBuilding()], background: [], contours: [], ...overrides };
}

/** What sheets say of a run: of a straight line from (−500, 0) to (500, 0). */
export function someSheets(
  fields: Partial<TitleFields> = {},
  run: Parameters<typeof aRunDetail>[0] = {},
): AboutSheets {
  return {
    scheme: { name: 'Port Dogger crossing', crs: { code: 32632, name: 'UTM zone 32N' } },
    run: aRunDetail({ number: 4, ...run }),
    fields: { ...aPlan([0, 0]).fields, ...fields },
    keyGround: [],
  };
}
