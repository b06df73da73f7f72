import { useEffect, useId, useRef, type MouseEvent, type ReactNode } from 'react';
import { KeyCap } from './key-cap.tsx';

/** Marks what has the focus when the dialog opens; without it, its first button. */
const FIRST_IN_FOCUS = 'data-first-in-focus';

type DialogProps = {
  readonly open: boolean;
  readonly title: string;
  readonly onClose: () => void;
  readonly children: ReactNode;
};

/**
 * Something that has to be answered before going on. The browser's own dialog keeps the focus inside,
 * closes on Esc and gives the focus back to what opened it.
 */
export function Dialog({ open, title, onClose, children }: DialogProps) {
  const id = useId();
  const element = useRef<HTMLDialogElement>(null);

  useEffect(() => {
    if (open) {
      element.current?.showModal();
      element.current?.querySelector<HTMLElement>(`[${FIRST_IN_FOCUS}]`)?.focus();
    } else {
      element.current?.close();
    }
  }, [open]);

  function closeFromOutside(event: MouseEvent<HTMLDialogElement>) {
    if (event.target === event.currentTarget) onClose();
  }

  return (
    <dialog
      ref={element}
      aria-labelledby={id}
      onClose={onClose}
      onMouseDown={closeFromOutside}
      className="appear w-[520px] max-w-[calc(100vw-32px)] rounded border border-ink bg-paper-raised text-ink shadow-lift backdrop:bg-ink/30"
    >
      {open && (
        <div className="px-4 pt-3 pb-4">
          <div className="mb-3 flex items-center justify-between gap-3 border-b border-hairline pb-2">
            <h2 id={id} className="text-lead">
              {title}
            </h2>
            <button
              type="button"
              aria-label="Close"
              className="-mr-1.5 min-h-6 px-1.5 max-sm:min-h-11 max-sm:min-w-11"
              onClick={onClose}
            >
              <span className="max-sm:hidden">
                <KeyCap>Esc</KeyCap>
              </span>
              <span className="text-small text-clay-deep underline sm:hidden">Close</span>
            </button>
          </div>
          {children}
        </div>
      )}
    </dialog>
  );
}
