import type { ReactNode } from 'react';

type PanelFrameProps = {
  readonly title: string;
  /** What to do, in a sentence or two. */
  readonly hint: string;
  /** Stay in sight under what is long. */
  readonly actions: ReactNode;
  readonly children: ReactNode;
};

/** What stands at the side while something is drawn. */
export function PanelFrame({ title, hint, actions, children }: PanelFrameProps) {
  return (
    <section aria-label={title}>
      <h2 className="text-h3">{title}</h2>
      <p className="mt-1 text-small text-ink-2">{hint}</p>
      <div className="mt-2.5 border-t-2 border-ink pt-1.5">{children}</div>
      <div className="sticky -bottom-6 mt-3 -mb-6 flex flex-wrap gap-2 border-t border-hairline bg-paper py-3 max-md:bottom-0 max-md:mb-0">
        {actions}
      </div>
    </section>
  );
}
