import { MATTER_STATES, type MatterState } from '../../../shared/schemas/matters.ts';

/** Which matters the inbox shows; it stands in its address. */
export type InboxFilter = {
  readonly state: MatterState | 'all';
  readonly kind: string;
  readonly text: string;
  readonly mine: boolean;
  readonly overdue: boolean;
};

/** The filter that an address says; what waits for the team where it says none. */
export function filterOfAddress(words: URLSearchParams): InboxFilter {
  const asked = words.get('state');
  const state = MATTER_STATES.find((one) => one === asked) ?? (asked === 'all' ? 'all' : 'open');
  return {
    state,
    kind: words.get('kind') ?? '',
    text: words.get('text') ?? '',
    mine: words.get('mine') === 'true',
    overdue: words.get('overdue') === 'true',
  };
}

function said(values: Readonly<Record<string, string>>): Record<string, string> {
  return Object.fromEntries(Object.entries(values).filter(([, value]) => value !== ''));
}

/** A filter as an address says it. */
export function addressOfFilter({ state, mine, overdue, kind, text }: InboxFilter) {
  return said({
    ...{ state: state === 'open' ? '' : state, kind, text },
    ...{ mine: mine ? 'true' : '', overdue: overdue ? 'true' : '' },
  });
}

/** A filter as the server is asked. */
export function queryOfFilter({ state, mine, overdue, kind, text }: InboxFilter) {
  return said({
    ...{ state: state === 'all' ? '' : state, kind, text: text.trim() },
    ...{ mine: mine ? 'true' : '', overdue: overdue ? 'true' : '' },
  });
}
