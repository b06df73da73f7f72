import { useQuery } from '@tanstack/react-query';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { BasisLine } from '../../../components/layout/basis-line.tsx';
import { formatDay } from '../../../lib/format-date.ts';
import { crsQuery } from '../../crs/api/get-crs.ts';
import { yourRoles } from '../../members/roles-in-words.ts';
import { can } from '../can.ts';

/** What a scheme's settings rest on: its grid, and what the person is in it. */
export function SchemeBasis({ scheme }: { readonly scheme: SchemeAnswer }) {
  const worksOnIt = can(scheme, 'readRegister');
  const { data: crs } = useQuery({ ...crsQuery(scheme.crs), enabled: worksOnIt });
  const grid = (
    <>
      <b>EPSG:{scheme.crs}</b> {crs?.name}
    </>
  );
  const archived =
    scheme.archivedAt !== null && `Archived ${formatDay(scheme.archivedAt)}: only read`;
  const words = yourRoles(scheme.roles);
  return (
    <BasisLine
      parts={[
        ...(archived === false ? [] : [<b key="archived">{archived}</b>]),
        ...(worksOnIt ? [grid] : []),
        `${words.charAt(0).toUpperCase()}${words.slice(1)}`,
      ]}
    />
  );
}
