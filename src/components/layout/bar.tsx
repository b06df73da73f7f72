import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { classNames } from '../../lib/class-names.ts';
import { BarTabs, type Tab } from './bar-tabs.tsx';
import { BrandMark } from './brand-mark.tsx';

type BarProps = {
  /** The scheme at hand and the way to others. */
  readonly scheme?: ReactNode;
  readonly tabs: readonly Tab[];
  /** Go to… and the person's menu. */
  readonly children: ReactNode;
};

/** The bar across the top of every screen; on a phone its tabs take a line of their own. */
export function Bar({ scheme, tabs, children }: BarProps) {
  return (
    <header className="flex flex-none flex-wrap items-stretch border-b border-ink bg-paper-raised pr-4 pl-3.5 max-md:px-1 print:hidden">
      <Link
        to="/"
        className="mr-2 flex h-bar items-center gap-[9px] pr-[18px] text-lead font-bold text-ink no-underline max-md:mr-0 max-md:px-2.5"
      >
        <BrandMark />
        <span className={classNames(scheme !== undefined && 'max-md:sr-only')}>Groundsill</span>
      </Link>
      {scheme}
      <BarTabs tabs={tabs} />
      <div className="ml-auto flex min-w-0 items-center gap-3.5 max-md:gap-0">{children}</div>
    </header>
  );
}
