import { Link } from 'react-router-dom';
import { sheetPath } from '../../../config/paths.ts';

type BuildingLinkProps = {
  readonly schemeId: string;
  readonly building: {
    readonly id: number;
    readonly reference: string;
    readonly name: string | null;
    readonly address?: string | null;
  };
};

/** A building by its reference, which leads to its sheet; what it is called is told beside. */
export function BuildingLink({ schemeId, building }: BuildingLinkProps) {
  const { id, reference, name, address } = building;
  return (
    <Link to={sheetPath(schemeId, id)} title={name ?? address ?? undefined}>
      {reference}
    </Link>
  );
}
