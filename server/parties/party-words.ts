import type { PartyColumn } from '../../shared/schemas/party-imports.ts';
import type { InterestValues, PartyValues } from '../../shared/schemas/parties.ts';
import { foldedWords } from '../crs/folded-words.ts';

/** What columns of a table of parties are called, the likeliest first: words in small letters. */
export const PARTY_COLUMN_ALIASES: Readonly<Record<PartyColumn, readonly string[]>> = {
  reference: ['building reference', 'building ref', 'building id', 'bldg ref', 'reference', 'ref', 'asset id', 'uprn', 'building'],
  buildingAddress: ['building address', 'property address', 'address of building', 'address of the building', 'premises', 'property', 'site address'],
  interest: ['interest', 'kind of interest', 'interest kind', 'type of interest', 'interest type', 'tenure', 'capacity', 'role'],
  name: ['name', 'party', 'party name', 'full name', 'name of party', 'owner', 'owner name', 'contact name', 'contact', 'company'],
  kind: ['kind of party', 'party kind', 'party type', 'type of party', 'kind', 'person or organisation', 'type'],
  address: ['postal address', 'party address', 'correspondence address', 'mailing address', 'contact address', 'address for letters', 'address', 'full address'],
  street: ['street', 'address line 1', 'line 1', 'address 1', 'street address'],
  place: ['place', 'town', 'city', 'post town', 'address line 2', 'line 2', 'address 2'],
  postcode: ['postcode', 'post code', 'postal code', 'zip', 'zip code'],
  email: ['e mail', 'email', 'email address', 'e mail address', 'mail'],
  channel: ['letters by', 'channel', 'preferred channel', 'send by', 'contact by', 'preferred contact'],
  representedBy: ['represented by', 'representative', 'agent', 'represented'],
  from: ['from', 'since', 'start', 'start date', 'from date', 'valid from', 'start of interest'],
  to: ['to', 'until', 'end', 'end date', 'to date', 'valid to', 'end of interest'],
}; // prettier-ignore

const INTERESTS: Readonly<Record<InterestValues['kind'], readonly string[]>> = {
  freeholder: ['freeholder', 'freehold', 'owner', 'owner occupier', 'landlord', 'proprietor'],
  leaseholder: ['leaseholder', 'leasehold', 'lessee', 'long leaseholder'],
  tenant: ['tenant', 'tenancy', 'occupier', 'occupant', 'resident', 'renter'],
  manager: ['manager', 'managing agent', 'management', 'agent', 'caretaker'],
};

const KINDS: Readonly<Record<PartyValues['kind'], readonly string[]>> = {
  person: ['person', 'individual', 'private', 'natural person'],
  organisation: ['organisation', 'organization', 'company', 'body', 'trust', 'authority', 'firm', 'business', 'charity'],
}; // prettier-ignore

const CHANNELS: Readonly<Record<PartyValues['channel'], readonly string[]>> = {
  'e-mail': ['e mail', 'email', 'mail', 'electronic'],
  post: ['post', 'letter', 'paper', 'postal', 'by post'],
};

function meant<Word extends string>(
  words: Readonly<Record<Word, readonly string[]>>,
  text: string,
): Word | undefined {
  const said = foldedWords(text).join(' ');
  return (Object.keys(words) as Word[]).find((word) => words[word].includes(said));
}

/** Which interest a word means. */
export function interestOf(text: string): InterestValues['kind'] | undefined {
  return meant(INTERESTS, text);
}

/** Which kind of party a word means. */
export function partyKindOf(text: string): PartyValues['kind'] | undefined {
  return meant(KINDS, text);
}

/** Which way of being written to a word means. */
export function channelOf(text: string): PartyValues['channel'] | undefined {
  return meant(CHANNELS, text);
}
