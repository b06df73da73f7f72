import { useSearchParams } from 'react-router-dom';

type View = 'all' | 'likely-same';

/** What is seen of the parties stands in the address, so that it can be sent to a colleague. */
export function usePartiesAddress() {
  const [params, setParams] = useSearchParams();
  function change(words: Readonly<Record<string, string>>, replace = false): void {
    const next = new URLSearchParams(params);
    for (const [name, value] of Object.entries(words)) {
      if (value === '') next.delete(name);
      else next.set(name, value);
    }
    setParams(next, { replace });
  }
  const view: View = params.get('view') === 'likely-same' ? 'likely-same' : 'all';
  return {
    search: params.get('search') ?? '',
    offset: Math.max(0, Math.floor(Number(params.get('offset') ?? 0)) || 0),
    view,
    partyId: params.get('party'),
    setSearch: (search: string) => {
      change({ search, offset: '' }, true);
    },
    setOffset: (offset: number) => {
      change({ offset: offset === 0 ? '' : String(offset) });
    },
    setView: (next: View) => {
      change({ view: next === 'all' ? '' : next, offset: '' });
    },
    open: (party: string | null) => {
      change({ party: party ?? '' });
    },
  };
}
