import { useState } from 'react';
import { useHotkeys } from '../../hooks/use-hotkeys.ts';
import { Dialog } from '../ui/dialog.tsx';
import { KeyCap } from '../ui/key-cap.tsx';
import { SearchList } from '../ui/search-list.tsx';

export type Destination = { readonly to: string; readonly title: string; readonly note: string };

type GoToProps = {
  readonly destinations: readonly Destination[];
  readonly onGo: (to: string) => void;
};

function isMeant({ title, note }: Destination, query: string): boolean {
  const words = query.toLowerCase().split(/\s+/);
  const text = `${title} ${note}`.toLowerCase();
  return words.every((word) => text.includes(word));
}

/** Goes anywhere by name; `/` opens it. */
export function GoTo({ destinations, onGo }: GoToProps) {
  const [isOpen, setOpen] = useState(false);
  const [query, setQuery] = useState('');
  useHotkeys({
    '/': () => {
      setOpen(true);
    },
  });
  function close() {
    setOpen(false);
    setQuery('');
  }
  const found = destinations.filter((destination) => isMeant(destination, query));
  return (
    <>
      <button
        type="button"
        className="flex h-7 w-44 items-center justify-between rounded border border-control bg-sheet px-2 text-small text-ink-3 hover:border-ink max-sm:h-bar max-sm:w-auto max-sm:border-0 max-sm:bg-transparent max-sm:px-3 max-sm:text-clay-deep max-sm:underline"
        onClick={() => {
          setOpen(true);
        }}
      >
        Go to…
        <span className="max-sm:hidden">
          <KeyCap>/</KeyCap>
        </span>
      </button>
      <Dialog open={isOpen} title="Go to…" onClose={close}>
        <SearchList
          label="A scheme or a screen"
          firstInFocus
          query={query}
          onQuery={setQuery}
          found={found.map(({ to, title, note }) => ({ id: to, title, note }))}
          nothing="Nothing here has this name."
          onChoose={(to) => {
            close();
            onGo(to);
          }}
        />
      </Dialog>
    </>
  );
}
