import type { ReactNode } from 'react';
import { Popover } from '../../../components/ui/popover.tsx';
import { classNames } from '../../../lib/class-names.ts';

type FilterChipProps = {
  readonly label: string;
  /** What is asked for, as `any` or `3 to 8 m`. */
  readonly words: string;
  readonly isSet: boolean;
  readonly startsOpen: boolean;
  readonly onRemove: () => void;
  readonly children: ReactNode | ((close: () => void) => ReactNode);
};

const CHIP =
  'flex h-[26px] max-w-[260px] items-center gap-1 rounded border px-2.5 text-small hover:border-ink max-sm:h-9';

/** One thing that the register is filtered by: pressed, it opens what can be chosen. */
export function FilterChip(props: FilterChipProps) {
  const { label, words, isSet, startsOpen, onRemove, children } = props;
  return (
    <span className="flex">
      <Popover
        name={`${label}: ${words}`}
        startsOpen={startsOpen}
        button={
          <span className="truncate">
            {label}: {isSet ? <b className="font-semibold">{words}</b> : words}
          </span>
        }
        buttonClassName={classNames(
          CHIP,
          isSet ? 'rounded-r-none border-ink bg-sheet' : 'border-control bg-paper-raised',
        )}
      >
        {children}
      </Popover>
      {isSet && (
        <button
          type="button"
          aria-label={`Any ${label.toLowerCase()}`}
          title="Take this filter off"
          onClick={onRemove}
          className="-ml-px grid h-[26px] w-6 place-items-center rounded rounded-l-none border border-ink bg-sheet hover:bg-paper-sunk max-sm:h-9 max-sm:w-9"
        >
          <svg width="8" height="8" viewBox="0 0 8 8" aria-hidden="true">
            <path d="M1 1l6 6M7 1 1 7" className="stroke-ink" strokeWidth="1.3" />
          </svg>
        </button>
      )}
    </span>
  );
}
