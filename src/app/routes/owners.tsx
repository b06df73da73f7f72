import { Navigate, Outlet } from 'react-router-dom';
import { SideParts } from '../../components/layout/side-parts.tsx';
import { ownersPath, PATHS, type OWNERS } from '../../config/paths.ts';
import { can } from '../../features/schemes/can.ts';
import { SchemeBasis } from '../../features/schemes/components/scheme-basis.tsx';
import { useScheme } from '../../features/schemes/scheme-context.ts';

type Part = {
  readonly part: keyof typeof OWNERS;
  readonly label: string;
  readonly needs: string;
};

const PARTS: readonly Part[] = [
  { part: 'parties', label: 'Parties', needs: 'readParties' },
  { part: 'letters', label: 'Letters', needs: 'readLetters' },
  { part: 'inbox', label: 'Inbox', needs: 'readMatters' },
  { part: 'appointments', label: 'Appointments', needs: 'readMatters' },
  { part: 'undertakings', label: 'Undertakings', needs: 'readUndertakings' },
];

function usePartsOfOwners() {
  const scheme = useScheme();
  return PARTS.filter(({ needs }) => can(scheme, needs)).map(({ part, label }) => {
    return { to: ownersPath(scheme.id, part), label };
  });
}

/** Opens the first part that the person may see. */
export function OwnersStart() {
  const [first] = usePartsOfOwners();
  return <Navigate replace to={first?.to ?? PATHS.schemes} />;
}

/** Everything between the team and those whose buildings stand above the line. */
export function OwnersPage() {
  const scheme = useScheme();
  const parts = usePartsOfOwners();
  return (
    <>
      <SchemeBasis scheme={scheme} />
      <SideParts label="Owners" parts={parts}>
        <Outlet />
      </SideParts>
    </>
  );
}
