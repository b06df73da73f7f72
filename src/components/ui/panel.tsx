import { useId, type ReactNode } from 'react';
import { classNames } from '../../lib/class-names.ts';

type PanelProps = {
  readonly title: string;
  /** Said after the title, in a lighter voice. */
  readonly note?: ReactNode;
  /** A link or button at the far end of the heading. */
  readonly action?: ReactNode;
  readonly className?: string;
  readonly children: ReactNode;
};

/** A block of a page under its heading and a heavy rule. */
export function Panel({ title, note, action, className, children }: PanelProps) {
  const id = useId();
  return (
    <section aria-labelledby={id} className={classNames('mt-5 first:mt-0', className)}>
      <div className="flex flex-wrap items-baseline gap-x-2.5 gap-y-1 border-b-2 border-ink pb-[7px] print:break-after-avoid">
        <h2 id={id} className="text-lead">
          {title}
        </h2>
        {note !== undefined && <span className="text-small text-ink-2">{note}</span>}
        {action !== undefined && <span className="ml-auto text-small">{action}</span>}
      </div>
      {children}
    </section>
  );
}
