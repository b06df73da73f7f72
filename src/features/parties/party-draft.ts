import {
  partyValuesSchema,
  type InterestValues,
  type Party,
  type PartyValues,
} from '../../../shared/schemas/parties.ts';

/** An interest as it is written, with what its building is called. */
export type InterestDraft = {
  readonly key: string;
  readonly building: Party['interests'][number]['building'];
  readonly kind: InterestValues['kind'];
  readonly from: string;
  readonly to: string;
};

/** A party as it is written: days and the address as text. */
export type PartyDraft = {
  readonly kind: PartyValues['kind'];
  readonly name: string;
  readonly address: string;
  readonly email: string;
  readonly channel: PartyValues['channel'];
  readonly representedBy: Party['representedBy'];
  readonly interests: readonly InterestDraft[];
};

export const NO_PARTY: PartyDraft = {
  ...{ kind: 'person', name: '', address: '', email: '', channel: 'post' },
  ...{ representedBy: null, interests: [] },
};

/** A party as it would be written again. */
export function draftOfParty(party: Party): PartyDraft {
  const { kind, name, address, email, channel, representedBy, interests } = party;
  return {
    ...{ kind, name, channel, representedBy },
    address: address.join('\n'),
    email: email ?? '',
    interests: interests.map((one) => ({
      ...{ key: one.id, building: one.building, kind: one.kind },
      from: one.from ?? '',
      to: one.to ?? '',
    })),
  };
}

/** What a draft comes to, or what is wrong with it, by field. */
export function readParty(
  draft: PartyDraft,
):
  | { readonly values: PartyValues }
  | { readonly faults: Readonly<Record<string, string | undefined>> } {
  const parsed = partyValuesSchema.safeParse({
    ...{ kind: draft.kind, name: draft.name, channel: draft.channel },
    address: draft.address.split('\n'),
    email: draft.email.trim() === '' ? null : draft.email,
    representedBy: draft.representedBy?.id ?? null,
    interests: draft.interests.map(({ building, kind, from, to }) => ({
      ...{ buildingId: building.id, kind },
      from: from === '' ? null : from,
      to: to === '' ? null : to,
    })),
  });
  if (parsed.success) return { values: parsed.data };
  // a line of the address is no field of its own
  const faults = parsed.error.issues.map(({ path, message }) => [
    path[0] === 'address' ? 'address' : path.join('.'),
    message,
  ]);
  return { faults: Object.fromEntries(faults.reverse()) as Record<string, string> };
}
