import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { visitPath } from '../../../config/paths.ts';
import { titleOfBuilding } from '../visit-words.ts';

type BuildingLineProps = {
  readonly schemeId: string;
  readonly building: {
    readonly id: number;
    readonly reference: string;
    readonly name: string | null;
    readonly address: string | null;
  };
  /** What stands under it. */
  readonly note?: ReactNode;
  /** What stands at its end. */
  readonly mark?: ReactNode;
};

/** One building of a list that is walked along: the whole line opens its visit. */
export function BuildingLine({ schemeId, building, note, mark }: BuildingLineProps) {
  return (
    <li className="border-b border-hairline">
      <Link
        to={visitPath(schemeId, building.id)}
        className="flex min-h-11 items-center gap-3 py-1.5 text-ink no-underline hover:bg-paper-sunk"
      >
        <span className="min-w-0 flex-1">
          <b className="block font-semibold break-words">{titleOfBuilding(building)}</b>
          {note !== undefined && <span className="block text-small text-ink-2">{note}</span>}
        </span>
        {mark}
      </Link>
    </li>
  );
}
