import { Outlet } from 'react-router-dom';
import { SideParts } from '../../components/layout/side-parts.tsx';
import { settingsPath, type SETTINGS } from '../../config/paths.ts';
import { can } from '../../features/schemes/can.ts';
import { SchemeBasis } from '../../features/schemes/components/scheme-basis.tsx';
import { useScheme } from '../../features/schemes/scheme-context.ts';

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

export function SettingsPage() {
  const scheme = useScheme();
  const parts = PARTS.filter(({ needs }) => can(scheme, needs));
  return (
    <>
      <SchemeBasis scheme={scheme} />
      <SideParts
        isExact
        label="Settings"
        parts={parts.map(({ part, label }) => ({ to: settingsPath(scheme.id, part), label }))}
      >
        <Outlet />
      </SideParts>
    </>
  );
}
