import { useEffect, useEffectEvent, useState, type RefObject } from 'react';
import { KeyCap } from '../../../components/ui/key-cap.tsx';
import { useDelayedValue } from '../../../hooks/use-delayed-value.ts';

const WHILE_TYPING = 250;

type RegisterSearchProps = {
  /** What the register is searched for now. */
  readonly words: string;
  readonly onSearch: (words: string) => void;
  readonly field: RefObject<HTMLInputElement | null>;
};

/** Searches the register by reference, name and address, as it is written. */
export function RegisterSearch({ words, onSearch, field }: RegisterSearchProps) {
  const [written, setWritten] = useState(words);
  const [known, setKnown] = useState(words);
  const settled = useDelayedValue(written, WHILE_TYPING);
  const search = useEffectEvent((next: string) => {
    if (next.trim() !== words) onSearch(next.trim());
  });
  // the address was changed otherwise: by Back, by a view
  if (words !== known) {
    setKnown(words);
    if (written.trim() !== words) setWritten(words);
  }
  useEffect(() => {
    search(settled);
  }, [settled]);

  return (
    <div role="search" aria-label="Register" className="relative flex w-[230px] max-sm:w-full">
      <input
        ref={field}
        type="search"
        aria-label="Search the register"
        placeholder="Reference, name or address"
        autoComplete="off"
        spellCheck={false}
        maxLength={200}
        value={written}
        onChange={({ target }) => {
          setWritten(target.value);
        }}
        onKeyDown={(event) => {
          if (event.key !== 'Escape') return;
          if (written === '') event.currentTarget.blur();
          else setWritten('');
          event.preventDefault();
        }}
        className="h-[30px] w-full rounded border border-control bg-sheet px-2 pr-8 text-small max-sm:h-11 max-sm:text-h3"
      />
      {written === '' && (
        <span className="pointer-events-none absolute top-1.5 right-2 max-sm:hidden">
          <KeyCap>/</KeyCap>
        </span>
      )}
    </div>
  );
}
