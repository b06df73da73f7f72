import { BasisLine } from '../../../components/layout/basis-line.tsx';
import type { CrsAnswer } from '../../../../shared/schemas/crs.ts';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';

type PlanBasisProps = { readonly scheme: SchemeAnswer; readonly crs: CrsAnswer | undefined };

/** What the plan rests on. */
export function PlanBasis({ scheme, crs }: PlanBasisProps) {
  const grid = crs === undefined ? `EPSG:${scheme.crs}` : `${crs.name}, EPSG:${crs.code}`;
  return (
    <BasisLine
      parts={[<b key="register">Register as it stands</b>, `Grid ${grid}`]}
      end="Nothing worked out yet"
    />
  );
}
