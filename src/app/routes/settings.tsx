import { NavLink, Outlet } from 'react-router-dom';
import { Content } from '../../components/layout/content.tsx';
import { settingsPath, type SETTINGS } from '../../config/paths.ts';
import { can } from '../../features/schemes/can.ts';
import { SchemeBasis } from '../../features/schemes/components/scheme-basis.tsx';
import { useScheme } from '../../features/schemes/scheme-context.ts';
import { classNames } from '../../lib/class-names.ts';

type Part = {
  readonly part: keyof typeof SETTINGS;
  readonly label: string;
  readonly needs: string;
};

const PARTS: readonly Part[] = [
  { part: 'description', label: 'Description', needs: 'readScheme' },
  { part: 'people', label: 'People', needs: 'readMembers' },
  { part: 'rules', label: 'Rules', needs: 'readRules' },
  { part: 'background', label: 'Background', needs: 'readRegister' },
  { part: 'ground', label: 'Ground', needs: 'readRegister' },
];

function partStyle({ isActive }: { readonly isActive: boolean }): string {
  return classNames(
    'flex h-row items-center border-l-[3px] px-3 text-small whitespace-nowrap no-underline max-md:h-11 max-md:border-b-[3px] max-md:border-l-0',
    isActive
      ? 'border-clay font-semibold text-ink'
      : 'border-transparent text-ink-2 hover:border-clay-line hover:text-ink',
  );
}

export function SettingsPage() {
  const scheme = useScheme();
  const parts = PARTS.filter(({ needs }) => can(scheme, needs));
  const hasParts = parts.length > 1;
  return (
    <>
      <SchemeBasis scheme={scheme} />
      <Content
        className={classNames(
          'overflow-auto',
          hasParts && 'grid grid-cols-[196px_minmax(0,1fr)] max-md:flex max-md:flex-col',
        )}
      >
        {hasParts && (
          <nav
            aria-label="Settings"
            className="border-r border-hairline pt-[22px] max-md:flex max-md:flex-none max-md:overflow-x-auto max-md:border-r-0 max-md:border-b max-md:pt-0"
          >
            {parts.map(({ part, label }) => (
              <NavLink key={part} end to={settingsPath(scheme.id, part)} className={partStyle}>
                {label}
              </NavLink>
            ))}
          </nav>
        )}
        <div className="min-w-0 max-md:flex-1">
          <Outlet />
        </div>
      </Content>
    </>
  );
}
