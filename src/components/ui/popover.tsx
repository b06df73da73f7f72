import { useLayoutEffect, useRef, type ReactNode } from 'react';
import { useDisclosure } from '../../hooks/use-disclosure.ts';
import { classNames } from '../../lib/class-names.ts';

type PopoverProps = {
  readonly button: ReactNode;
  /** What the button and what it opens are called, where the button alone is too short. */
  readonly name: string;
  readonly buttonClassName?: string;
  readonly className?: string;
  readonly startsOpen?: boolean;
  /** Stays open while something in it is pressed. */
  readonly children: ReactNode | ((close: () => void) => ReactNode);
};

const PANEL =
  'appear absolute top-full left-0 z-40 mt-1 max-h-[60vh] w-max min-w-[220px] overflow-auto rounded border ' +
  'max-w-[340px] border-rule bg-paper-raised p-3 shadow-lift max-sm:fixed max-sm:inset-x-2 max-sm:top-auto ' +
  'max-sm:bottom-2 max-sm:w-auto max-sm:max-w-none';
const FOCUSABLE = 'input, select, button';

/** Keeps what opens inside of the window, and gives it the focus. */
function usePlaced(isOpen: boolean) {
  const panel = useRef<HTMLDivElement>(null);
  useLayoutEffect(() => {
    const element = panel.current;
    if (!isOpen || element === null) return;
    const over = element.getBoundingClientRect().right - document.documentElement.clientWidth + 8;
    if (over > 0) element.style.marginLeft = `${-over}px`;
    element.querySelector<HTMLElement>(FOCUSABLE)?.focus();
  }, [isOpen]);
  return panel;
}

/** Something small to choose or write in, which opens under its button. */
export function Popover(props: PopoverProps) {
  const { button, name, buttonClassName, className, startsOpen = false, children } = props;
  const { isOpen, toggle, close, frame } = useDisclosure(startsOpen);
  const panel = usePlaced(isOpen);
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
        <div ref={panel} role="group" aria-label={name} className={PANEL}>
          {typeof children === 'function' ? children(close) : children}
        </div>
      )}
    </div>
  );
}
