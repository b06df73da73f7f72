import { compute, type Asked, type Computed } from '../../server/runs/compute.ts';

type Chunk = Asked & { readonly kind: 'chunk' };
type Contours = Asked & { readonly kind: 'contours' };
type Numbered = { readonly id: string };
type Result = { readonly buildingId: number };

const computed = new Map<string, string>();

function once(asked: Chunk | Contours): string {
  const key = JSON.stringify(asked);
  const text = computed.get(key) ?? (compute(asked) as string);
  computed.set(key, text);
  return text;
}

/**
 * The chunk with its buildings numbered anew, all in as many figures, and what they are numbered by the
 * database. They stay in order as texts, by which rows are put together.
 */
function numberedAnew(asked: Chunk): { asked: Chunk; ids: Map<number, number> } {
  const members = JSON.parse(asked.members) as Numbered[];
  const beside = JSON.parse(asked.beside) as Numbered[];
  const sorted = [...members, ...beside].map(({ id }) => id).sort();
  const anew = new Map(sorted.map((id, k) => [id, 1_000_000 + k]));
  const renumber = (all: readonly Numbered[]) =>
    JSON.stringify(all.map((one) => ({ ...one, id: String(anew.get(one.id)) })));
  return {
    asked: { ...asked, members: renumber(members), beside: renumber(beside) },
    ids: new Map([...anew].map(([id, k]) => [k, Number(id)])),
  };
}

function chunkOnce(chunk: Chunk): string {
  const { asked, ids } = numberedAnew(chunk);
  const results = JSON.parse(once(asked)) as Result[];
  return JSON.stringify(
    results.map((result) => ({ ...result, buildingId: ids.get(result.buildingId) })),
  );
}

/**
 * Does a piece of a run's arithmetic, or tells what came of it before: most tests begin with the same small
 * town, whatever the database numbers its buildings.
 */
export function computedOnce<A extends Asked>(asked: A): Computed<A> | Promise<Computed<A>> {
  if (asked.kind === 'chunk') return chunkOnce(asked) as Computed<A>;
  return asked.kind === 'contours' ? (once(asked) as Computed<A>) : compute(asked);
}
