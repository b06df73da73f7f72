import type { ReactNode } from 'react';

/** Says quietly that something was done; nothing is left to do about it. */
export function DoneNote({ children }: { readonly children: ReactNode }) {
  return (
    <div role="status" className="text-small text-ink-2">
      {children}
    </div>
  );
}
