import { Link } from 'react-router-dom';
import type { SchemeAnswer } from '../../../../shared/schemas/schemes.ts';
import { schemePath } from '../../../config/paths.ts';
import { formatDay } from '../../../lib/format-date.ts';
import { can } from '../can.ts';
import { CardPicture } from './card-picture.tsx';

/** A scheme in the list of them; the whole card leads to it. */
export function SchemeCard({ scheme }: { readonly scheme: SchemeAnswer }) {
  const { id, name, description, crs, archivedAt } = scheme;
  return (
    <li className="relative mb-4 border border-rule bg-sheet hover:border-ink">
      {archivedAt === null && <CardPicture scheme={scheme} />}
      <div className="px-3.5 pt-3 pb-[13px]">
        <div className="flex items-baseline gap-2">
          <h3 className="min-w-0 text-lead break-words text-balance">
            <Link
              to={schemePath(id)}
              className="text-ink no-underline after:absolute after:inset-0 hover:underline"
            >
              {name}
            </Link>
          </h3>
          <small className="ml-auto text-small whitespace-nowrap text-ink-2">
            {archivedAt !== null && `Archived ${formatDay(archivedAt)}`}
            {archivedAt === null && can(scheme, 'readRegister') && `EPSG:${crs}`}
          </small>
        </div>
        {description !== '' && (
          <p className="mt-1 line-clamp-3 text-small text-ink-2">{description}</p>
        )}
      </div>
    </li>
  );
}
