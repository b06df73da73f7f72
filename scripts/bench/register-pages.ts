import {
  REGISTER_ORDER,
  type RegisterColumn,
  type RegisterFilter,
  type RegisterSort,
} from '../../shared/schemas/register.ts';
import type { Register } from '../../server/register/register-of.ts';
import { registerPage } from '../../server/register/register-page.ts';
import type { Services } from '../../server/services.ts';
import { createTileCache } from '../../server/tiles/tile-cache.ts';
import { percentiles, times } from './percentiles.ts';
import { seededRandom } from './seeded-random.ts';

const RUNS = { first: 11, far: 5, turned: 21 } as const;
const FAR = 90_000;

export type NamedFilter = readonly [name: string, filter: RegisterFilter];

/** A register to be timed. */
export type Bench = {
  readonly services: Pick<Services, 'database' | 'tiles'>;
  readonly register: Register;
};

function say(name: string, words: string): void {
  console.log(`register, ${name}: ${words}`);
}

function pageAt({ services, register }: Bench, filter: RegisterFilter, sort: RegisterSort) {
  return (offset: number) => registerPage(services, register, { filter, sort, offset, limit: 100 });
}

/** The first page and a jump far down, both before anything is kept, and pages turned anywhere after it. */
async function pageTimes(bench: Bench, filter: RegisterFilter, sort: RegisterSort) {
  const random = seededRandom(3);
  const anew = () => ({ ...bench, services: { ...bench.services, tiles: createTileCache() } });
  const page = pageAt(anew(), filter, sort);
  await page(0);
  return {
    first: await times(RUNS.first, () => pageAt(anew(), filter, sort)(0)),
    far: await times(RUNS.far, () => pageAt(anew(), filter, sort)(FAR)),
    turned: await times(RUNS.turned, () => page(Math.floor(random() * FAR))),
  };
}

/** Prints how long pages of a register take, by each column both ways and by each filter. */
export async function benchPages(
  bench: Bench,
  columns: readonly RegisterColumn[],
  filters: readonly NamedFilter[],
): Promise<void> {
  const asked = [
    ...columns.flatMap((column) =>
      [false, true].map((descending) => {
        return [`by ${column}${descending ? ', descending' : ''}`, {}, { column, descending }] as const; // prettier-ignore
      }),
    ),
    ...filters.map(([name, filter]) => [`filtered by ${name}`, filter, REGISTER_ORDER] as const),
  ];
  const all: Record<'first' | 'far' | 'turned', number[]> = { first: [], far: [], turned: [] };
  for (const [name, filter, sort] of asked) {
    const { first, far, turned } = await pageTimes(bench, filter, sort);
    say(name, `first page ${percentiles(first)}; far jump ${percentiles(far)}; then ${percentiles(turned)}`); // prettier-ignore
    all.first.push(...first);
    all.far.push(...far);
    all.turned.push(...turned);
  }
  say('all first pages', percentiles(all.first));
  say('all far jumps', percentiles(all.far));
  say('all pages turned then', percentiles(all.turned));
}
