import { NavLink } from 'react-router-dom';
import { classNames } from '../../lib/class-names.ts';

export type Tab = { readonly to: string; readonly label: string; readonly end?: boolean };

function tabStyle({ isActive }: { readonly isActive: boolean }): string {
  return classNames(
    'flex h-bar items-center border-b-[3px] px-2.5 pt-0.5 no-underline max-md:px-3.5',
    isActive
      ? 'border-clay font-semibold text-ink'
      : 'border-transparent text-ink-2 hover:text-ink hover:border-clay-line',
  );
}

/** The screens at hand, as words; only those that work are there. */
export function BarTabs({ tabs }: { readonly tabs: readonly Tab[] }) {
  if (tabs.length === 0) return null;
  return (
    <nav
      aria-label="Screens"
      className="-mb-px flex max-md:order-last max-md:-mx-1 max-md:w-[calc(100%+8px)] max-md:overflow-x-auto max-md:px-1 max-md:border-t max-md:border-hairline"
    >
      {tabs.map(({ to, label, end = false }) => (
        <NavLink key={to} to={to} end={end} className={tabStyle}>
          {label}
        </NavLink>
      ))}
    </nav>
  );
}
