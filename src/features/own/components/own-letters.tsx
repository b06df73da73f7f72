import { Link } from 'react-router-dom';
import type { OwnLetter } from '../../../../shared/schemas/own.ts';
import { ownLetterPath } from '../../../config/paths.ts';
import { formatDay } from '../../../lib/format-date.ts';
import { useScheme } from '../../schemes/scheme-context.ts';
import { useOwnZone } from '../hooks/use-own-zone.ts';

/** The letters that were sent to an owner, the newest first. */
export function OwnLetters({ letters }: { readonly letters: readonly OwnLetter[] }) {
  const scheme = useScheme();
  const zone = useOwnZone();
  return (
    <section className="mt-7">
      <h2 className="mb-1 text-h2">My letters</h2>
      {letters.length === 0 && <p className="text-lead text-ink-2">No letters yet.</p>}
      <ul>
        {letters.map(({ id, subject, sentAt, acknowledgedAt }) => (
          <li key={id} className="border-hairline py-1.5 [&+&]:border-t">
            <Link
              to={ownLetterPath(scheme.id, id)}
              className="inline-flex min-h-touch items-center"
            >
              {subject}
            </Link>
            <span className="block text-lead text-ink-2">
              {`${formatDay(sentAt, zone)}. `}
              {acknowledgedAt === null
                ? 'You have not told us yet that you have it.'
                : `You confirmed on ${formatDay(acknowledgedAt, zone)}.`}
            </span>
          </li>
        ))}
      </ul>
    </section>
  );
}
