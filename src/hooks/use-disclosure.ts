import { useEffect, useRef, useState, type RefObject } from 'react';

export type Disclosure = {
  readonly isOpen: boolean;
  readonly toggle: () => void;
  readonly close: () => void;
  /** Goes on the element that holds the button and what it opens. */
  readonly frame: RefObject<HTMLDivElement | null>;
};

/** Something small that opens under its button; closes on Esc, by a press outside and when focus leaves. */
export function useDisclosure(startsOpen = false): Disclosure {
  const [isOpen, setOpen] = useState(startsOpen);
  const frame = useRef<HTMLDivElement>(null);

  useEffect(() => {
    if (!isOpen) return undefined;
    function closeOutside({ target }: Event) {
      if (target instanceof Node && frame.current?.contains(target) === true) return;
      setOpen(false);
    }
    function closeOnEscape(event: KeyboardEvent) {
      if (event.key !== 'Escape') return;
      // the key closes this and nothing behind it
      event.preventDefault();
      setOpen(false);
      frame.current?.querySelector('button')?.focus();
    }
    document.addEventListener('pointerdown', closeOutside);
    document.addEventListener('focusin', closeOutside);
    document.addEventListener('keydown', closeOnEscape, true);
    return () => {
      document.removeEventListener('pointerdown', closeOutside);
      document.removeEventListener('focusin', closeOutside);
      document.removeEventListener('keydown', closeOnEscape, true);
    };
  }, [isOpen]);

  return {
    isOpen,
    frame,
    toggle: () => {
      setOpen((now) => !now);
    },
    close: () => {
      setOpen(false);
    },
  };
}
