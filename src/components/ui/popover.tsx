import type { ReactNode } from 'react';
import { useDisclosure } from '../../hooks/use-disclosure.ts';
import { classNames } from '../../lib/class-names.ts';
import { usePlaced } from './use-placed.ts';

type PopoverProps = {
  readonly button: ReactNode;
  /** What the button and what it opens are called, where the button alone is too short. */
  readonly name: string;
  readonly buttonClassName?: string;
  readonly className?: string;
  readonly startsOpen?: boolean;
  /** Has more to read than to choose from, and may stand in what scrolls. */
  readonly wide?: boolean;
  /** Stays open while something in it is pressed. */
  readonly children: ReactNode | ((close: () => void) => ReactNode);
};

const PANEL =
  'appear z-40 max-h-[60vh] w-max min-w-[220px] overflow-auto rounded border border-rule bg-paper-raised ' +
  'p-3 shadow-lift max-sm:fixed max-sm:inset-x-2 max-sm:top-auto max-sm:bottom-2 max-sm:w-auto ' +
  'max-sm:max-w-none';
const UNDER_BUTTON = 'absolute top-full left-0 mt-1 max-w-[340px]';
/** Nothing that scrolls cuts it off. */
const FREE = 'fixed max-w-[460px] whitespace-normal text-left font-normal text-ink';

/** Something small to choose or write in, which opens under its button. */
export function Popover(props: PopoverProps) {
  const { button, name, buttonClassName, className, startsOpen, wide = false, children } = props;
  const { isOpen, toggle, close, frame } = useDisclosure(startsOpen);
  const panel = usePlaced(isOpen, wide);
  return (
    <div ref={frame} className={classNames('relative flex', className)}>
      <button
        type="button"
        aria-label={name}
        aria-expanded={isOpen}
        className={buttonClassName}
        onClick={toggle}
      >
        {button}
      </button>
      {isOpen && (
        <div
          ref={panel}
          role="group"
          aria-label={name}
          className={classNames(PANEL, wide ? FREE : UNDER_BUTTON)}
        >
          {typeof children === 'function' ? children(close) : children}
        </div>
      )}
    </div>
  );
}
