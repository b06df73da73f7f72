import type { ReactNode } from 'react';
import { NavLink } from 'react-router-dom';
import { classNames } from '../../lib/class-names.ts';
import { Content } from './content.tsx';

type Part = { readonly to: string; readonly label: string };

function partStyle({ isActive }: { readonly isActive: boolean }): string {
  return classNames(
    'flex h-row items-center border-l-[3px] px-3 text-small whitespace-nowrap no-underline max-md:h-11 max-md:border-b-[3px] max-md:border-l-0',
    isActive
      ? 'border-clay font-semibold text-ink'
      : 'border-transparent text-ink-2 hover:border-clay-line hover:text-ink',
  );
}

/** A screen in several parts, their names at the side; a single part stands alone. */
export function SideParts({
  label,
  parts,
  isExact = false,
  children,
}: {
  readonly label: string;
  readonly parts: readonly Part[];
  /** Whether a part is at hand at its own address only, not below it. */
  readonly isExact?: boolean;
  readonly children: ReactNode;
}) {
  const hasParts = parts.length > 1;
  return (
    <Content
      className={classNames(
        'overflow-auto',
        hasParts && 'grid grid-cols-[196px_minmax(0,1fr)] max-md:flex max-md:flex-col',
      )}
    >
      {hasParts && (
        <nav
          aria-label={label}
          className="border-r border-hairline pt-[22px] max-md:flex max-md:flex-none max-md:overflow-x-auto max-md:border-r-0 max-md:border-b max-md:pt-0"
        >
          {parts.map((part) => (
            <NavLink key={part.to} end={isExact} to={part.to} className={partStyle}>
              {part.label}
            </NavLink>
          ))}
        </nav>
      )}
      <div className="min-w-0 max-md:flex-1">{children}</div>
    </Content>
  );
}
