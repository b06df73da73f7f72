import { NavLink } from 'react-router-dom';
import type { MailboxEntryAnswer } from '../../../../shared/schemas/mailbox.ts';
import { letterPath } from '../../../config/paths.ts';
import { classNames } from '../../../lib/class-names.ts';
import { formatMoment } from '../../../lib/format-date.ts';

function lineStyle({ isActive }: { readonly isActive: boolean }): string {
  return classNames(
    'block border-b border-hairline px-4 py-2 text-small text-ink no-underline',
    isActive ? 'bg-select-wash shadow-[inset_4px_0_var(--select)]' : 'hover:bg-paper-sunk',
  );
}

/** The letters, newest first. */
export function LetterList({ letters }: { readonly letters: readonly MailboxEntryAnswer[] }) {
  return (
    <ul className="border-t border-hairline">
      {letters.map(({ id, to, subject, receivedAt }) => (
        <li key={id}>
          <NavLink to={letterPath(id)} className={lineStyle}>
            <span className="flex items-baseline justify-between gap-3">
              <span className="min-w-0 truncate text-ink-2">{to}</span>
              <span className="text-cap whitespace-nowrap text-ink-3">
                {formatMoment(receivedAt)}
              </span>
            </span>
            <b className="block truncate font-semibold">{subject}</b>
          </NavLink>
        </li>
      ))}
    </ul>
  );
}
