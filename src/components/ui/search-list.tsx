import { useEffect, useRef, type ReactNode } from 'react';
import { classNames } from '../../lib/class-names.ts';
import { FieldFrame, INPUT_STYLE, type FieldWords } from './field-frame.tsx';
import { useListCursor } from './use-list-cursor.ts';

export type Found = { readonly id: string; readonly title: ReactNode; readonly note?: ReactNode };

type SearchListProps = FieldWords & {
  readonly query: string;
  readonly onQuery: (query: string) => void;
  readonly found: readonly Found[];
  readonly onChoose: (id: string) => void;
  /** Said in place of the list when nothing is found, or while it is being looked for. */
  readonly nothing?: string;
  /** Of the dialog that it stands in. */
  readonly firstInFocus?: boolean;
  readonly placeholder?: string;
};

type OptionProps = Found & {
  readonly listId: string;
  readonly isReached: boolean;
  readonly onReach: () => void;
  readonly onChoose: () => void;
};

function FoundOption({ id, title, note, listId, isReached, onReach, onChoose }: OptionProps) {
  const element = useRef<HTMLLIElement>(null);
  useEffect(() => {
    if (isReached) element.current?.scrollIntoView({ block: 'nearest' });
  }, [isReached]);
  return (
    <li
      ref={element}
      id={`${listId}-${id}`}
      role="option"
      aria-selected={isReached}
      onMouseMove={onReach}
      onClick={onChoose}
      className={classNames(
        'flex min-h-row cursor-pointer items-baseline gap-x-4 border-b border-hairline px-2 py-1.5 text-small last:border-0 max-sm:min-h-11 max-sm:flex-col',
        isReached && 'bg-select-wash shadow-[inset_4px_0_var(--select)]',
      )}
    >
      <span className="flex-none font-semibold max-sm:flex-initial">{title}</span>
      {note !== undefined && (
        <span className="text-ink-2 max-sm:line-clamp-2 sm:ml-auto sm:min-w-0 sm:truncate">
          {note}
        </span>
      )}
    </li>
  );
}

type FoundListProps = Pick<SearchListProps, 'found' | 'onChoose'> & {
  readonly listId: string;
  readonly cursor: number;
  readonly moveTo: (index: number) => void;
};

function FoundList({ listId, found, cursor, moveTo, onChoose }: FoundListProps) {
  return (
    <ul
      id={listId}
      role="listbox"
      aria-label="Found"
      className={classNames(
        'mt-1 max-h-[300px] overflow-auto border-rule bg-sheet',
        found.length > 0 && 'border',
      )}
    >
      {found.map((one, index) => (
        <FoundOption
          key={one.id}
          {...one}
          listId={listId}
          isReached={index === cursor}
          onReach={() => {
            moveTo(index);
          }}
          onChoose={() => {
            onChoose(one.id);
          }}
        />
      ))}
    </ul>
  );
}

/** A field that searches and the list of what it finds; arrows move, Enter takes. */
export function SearchList(props: SearchListProps) {
  const { query, onQuery, found, onChoose, nothing, firstInFocus, placeholder, ...words } = props;
  const { cursor, moveTo, onKeyDown } = useListCursor(found.length, (index) => {
    const chosen = found[index];
    if (chosen !== undefined) onChoose(chosen.id);
  });
  const reached = found[cursor];

  return (
    <FieldFrame {...words}>
      {(ties) => {
        const listId = `${ties.id}-list`;
        return (
          <>
            <input
              {...ties}
              data-first-in-focus={firstInFocus}
              role="combobox"
              type="text"
              autoComplete="off"
              spellCheck={false}
              placeholder={placeholder}
              aria-expanded={found.length > 0}
              aria-controls={listId}
              aria-autocomplete="list"
              aria-activedescendant={reached && `${listId}-${reached.id}`}
              value={query}
              onKeyDown={onKeyDown}
              onChange={({ target }) => {
                moveTo(0);
                onQuery(target.value);
              }}
              className={classNames(INPUT_STYLE, 'h-[34px] max-sm:h-11')}
            />
            <FoundList {...{ listId, found, cursor, moveTo, onChoose }} />
            <p role="status" className="text-small text-ink-2">
              {found.length === 0 ? nothing : ''}
            </p>
          </>
        );
      }}
    </FieldFrame>
  );
}
