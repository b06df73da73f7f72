import { useEffect, useRef, type ReactNode } from 'react';

/** Says thank you and what happens next; the focus comes to it, so that it is heard. */
export function ThanksNote({ children }: { readonly children: ReactNode }) {
  const note = useRef<HTMLDivElement>(null);
  useEffect(() => {
    note.current?.focus();
  }, []);
  return (
    <div
      ref={note}
      tabIndex={-1}
      role="status"
      className="mt-5 border-l-4 border-ink bg-paper-raised px-5 py-4"
    >
      {children}
    </div>
  );
}
