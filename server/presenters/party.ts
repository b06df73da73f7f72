import { partySchema, type Party } from '../../shared/schemas/parties.ts';
import {
  likelySameSchema,
  partiesSchema,
  partyDetailSchema,
  type LikelySame,
  type PartyDetail,
} from '../../shared/schemas/party-answers.ts';
import type { z } from 'zod';
import type { FoundListedParty, FoundParty, LikelyPair } from '../models/parties.ts';
import type { FoundPartyChange } from '../models/party-changes.ts';

function told(party: FoundParty): Party {
  return {
    id: party.id,
    kind: party.kind,
    name: party.name,
    address: party.address === '' ? [] : party.address.split('\n'),
    email: party.email,
    channel: party.channel,
    representedBy: party.representedBy,
    person: party.person,
    version: party.version,
    interests: party.interests,
    mergedInto: party.mergedInto,
    erasedAt: party.erasedAt?.toISOString() ?? null,
  };
}

/** What leaves the server of a party. */
export function presentParty(party: FoundParty): Party {
  return partySchema.parse(told(party));
}

/** What leaves the server of a page of parties. */
export function presentParties(page: {
  readonly found: number;
  readonly parties: readonly FoundListedParty[];
}): z.infer<typeof partiesSchema> {
  return partiesSchema.parse({
    found: page.found,
    parties: page.parties.map((one) => ({ ...told(one), interestCount: one.interestCount })),
  });
}

/** What leaves the server of a party and its history, and until when letters to an erased one are kept. */
export function presentPartyDetail(
  party: FoundParty,
  changes: readonly FoundPartyChange[],
  lettersKeptUntil: string | null,
): PartyDetail {
  const history = changes.map(({ at, by, action, before, after }) => {
    return { at: at.toISOString(), by, action, before, after };
  });
  return partyDetailSchema.parse({ party: told(party), lettersKeptUntil, history });
}

/** What leaves the server of parties that are likely the same. */
export function presentLikelySame(
  pairs: readonly LikelyPair[],
  parties: readonly FoundParty[],
): LikelySame {
  const byId = new Map(parties.map((party) => [party.id, presentParty(party)]));
  return likelySameSchema.parse(
    pairs.map(({ because, ids }) => ({
      because,
      parties: ids.flatMap((id) => {
        const party = byId.get(id);
        if (party === undefined) return [];
        const { kind, name, address, email, version } = party;
        return [{ id, kind, name, address, email, version }];
      }),
    })),
  );
}
