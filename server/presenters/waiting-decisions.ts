import type { RegisterFilter } from '../../shared/schemas/register.ts';
import type { WaitingItem } from '../../shared/schemas/waiting.ts';
import type { DecisionsWaiting } from '../models/find-decisions-waiting.ts';

function item(
  kind: WaitingItem['kind'],
  { count, since }: { readonly count: number; readonly since: Date | null },
  words: readonly [text: string, link: string],
): WaitingItem[] {
  if (count === 0 || since === null) return [];
  const [text, link] = words;
  return [{ kind, count, text, since: since.toISOString(), link }];
}

/** What of the assessors' list waits for an assessor, each leading to those buildings. */
export function presentDecisionsWaiting(page: string, waiting: DecisionsWaiting): WaitingItem[] {
  const register = (state: string) => {
    const filter: RegisterFilter = { any: { state: [state] } };
    return `${page}/register?${new URLSearchParams({ filter: JSON.stringify(filter) }).toString()}`;
  };
  const { toCheck, toCheckSince, returned, returnedSince, again, againSince } = waiting;
  return [
    ...item('decisions-to-check', { count: toCheck, since: toCheckSince }, [
      'Prepared by somebody else, and checked by you.',
      register('waiting for check'),
    ]),
    ...item('decisions-returned', { count: returned, since: returnedSince }, [
      'Returned to you with a comment.',
      register('returned'),
    ]),
    ...item('decisions-again', { count: again, since: againSince }, [
      'What they rest on has changed.',
      register('to look at again'),
    ]),
  ];
}
