import type { InterestValues, PartyValues } from '../../shared/schemas/parties.ts';
import { sameWords } from './same-words.ts';

/** A party as an import sees it: who it is, and what is held already. */
export type KnownParty = {
  readonly id: string;
  /** Whether it comes with this import. */
  readonly isNew: boolean;
  readonly name: string;
  readonly address: string;
  email: string | null;
  representedBy: string | null;
  readonly interests: InterestValues[];
};

type Named = Pick<PartyValues, 'name' | 'email'> & { readonly address: string };

/** A party as the list of parties holds it; a merged one says which it is now. */
export type ListedBefore = Omit<KnownParty, 'isNew'> & { readonly mergedInto: string | null };

function keysOf({ name, address, email }: Named): string[] {
  const byAddress = `address ${sameWords(name)} | ${sameWords(address)}`;
  return email === null
    ? [byAddress]
    : [byAddress, `e-mail ${sameWords(name)} | ${email.toLowerCase()}`];
}

/** Parties by what tells them apart: name and address, or name and e-mail. */
export function partyIndex(listed: readonly ListedBefore[]) {
  const byId = new Map(listed.map((one) => [one.id, one]));
  const parties = new Map<string, KnownParty>();
  const byKey = new Map<string, KnownParty>();
  const byName = new Map<string, Set<KnownParty>>();

  function name(party: KnownParty, named: Named): void {
    for (const key of keysOf(named)) if (!byKey.has(key)) byKey.set(key, party);
    const same = byName.get(sameWords(named.name)) ?? new Set();
    byName.set(sameWords(named.name), same.add(party));
  }
  function finalOf(one: ListedBefore): ListedBefore {
    const next = one.mergedInto === null ? undefined : byId.get(one.mergedInto);
    return next === undefined ? one : finalOf(next);
  }
  for (const one of listed) {
    const live = finalOf(one);
    const party = parties.get(live.id) ?? { ...live, isNew: false };
    parties.set(live.id, party);
    name(party, one);
  }
  return {
    /** The one that this is, if it is known. */
    find: (named: Named): KnownParty | undefined =>
      keysOf(named)
        .map((key) => byKey.get(key))
        .find((party) => party !== undefined),
    add: (party: KnownParty): void => {
      name(party, party);
    },
    /** All that go by a name. */
    called: (words: string): KnownParty[] => [...(byName.get(sameWords(words)) ?? [])],
  };
}
