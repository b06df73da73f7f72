import type { ReactNode } from 'react';
import { useDisclosure } from '../../hooks/use-disclosure.ts';
import { classNames } from '../../lib/class-names.ts';
import { useInside } from './use-placed.ts';

/** The look of a line in a menu, link or button. */
export const MENU_LINE =
  'flex min-h-row w-full items-center gap-3 px-3 py-1.5 text-left text-small text-ink no-underline ' +
  'hover:bg-paper-sunk max-sm:min-h-11 max-sm:text-body';

type MenuProps = {
  /** What the button says, and what it is called where that is too short to be understood. */
  readonly button: ReactNode;
  readonly name?: string;
  readonly buttonClassName?: string;
  readonly align: 'left' | 'right';
  readonly className?: string;
  /** The lines; the menu closes after one is pressed. */
  readonly children: ReactNode;
};

/** A short list that opens under its button. */
export function Menu({ button, name, buttonClassName, align, className, children }: MenuProps) {
  const { isOpen, toggle, close, frame } = useDisclosure();
  const panel = useInside(isOpen);
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
          className={classNames(
            'appear absolute top-full z-40 max-h-[70vh] w-max min-w-[200px] overflow-auto rounded border',
            'max-w-[min(340px,calc(100vw-24px))] border-rule bg-paper-raised py-1 shadow-lift',
            align === 'left' ? 'left-0' : 'right-0',
          )}
        >
          <div onClick={close}>{children}</div>
        </div>
      )}
    </div>
  );
}
