import { Dialog } from '../ui/dialog.tsx';
import { KeyCap } from '../ui/key-cap.tsx';
import { SearchList } from '../ui/search-list.tsx';

export type Destination = { readonly to: string; readonly title: string; readonly note: string };

type GoToProps = {
  /** Whether `/` opens it here. */
  readonly hasKey: boolean;
  readonly isOpen: boolean;
  readonly onOpen: () => void;
  readonly onClose: () => void;
  readonly query: string;
  readonly onQuery: (query: string) => void;
  /** What the query means, the best first. */
  readonly found: readonly Destination[];
  readonly onGo: (to: string) => void;
};

/** Goes anywhere by name. */
export function GoTo({ hasKey, isOpen, onOpen, onClose, query, onQuery, found, onGo }: GoToProps) {
  return (
    <>
      <button
        type="button"
        className="flex h-7 w-44 max-lg:w-28 items-center justify-between rounded border border-control bg-sheet px-2 text-small text-ink-3 hover:border-ink max-md:h-bar max-md:w-auto max-md:border-0 max-md:bg-transparent max-md:px-3 max-md:text-clay-deep max-md:underline"
        onClick={onOpen}
      >
        Go to…
        {hasKey && (
          <span className="max-md:hidden">
            <KeyCap>/</KeyCap>
          </span>
        )}
      </button>
      <Dialog open={isOpen} title="Go to…" onClose={onClose}>
        <SearchList
          label="A scheme, a screen or a building"
          firstInFocus
          query={query}
          onQuery={onQuery}
          found={found.map(({ to, title, note }) => ({ id: to, title, note }))}
          nothing="Nothing here has this name."
          onChoose={onGo}
        />
      </Dialog>
    </>
  );
}
