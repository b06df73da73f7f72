import { Link } from 'react-router-dom';
import type { Own } from '../../../../shared/schemas/own.ts';
import { PATHS, settingsPath } from '../../../config/paths.ts';
import { useScheme } from '../../schemes/scheme-context.ts';

/** As high as a thumb wants it, in the line of the text. */
const TARGET = 'inline-flex min-h-touch items-center';

/** What a forecast is not, whom to ask, and where the works and the method are told of. */
export function Contact({ contact }: { readonly contact: Own['contact'] }) {
  const scheme = useScheme();
  return (
    <p className="mt-7 border-t border-hairline pt-3 text-roomy text-ink-2">
      This is a forecast. It does not replace the survey. {`Ask us anything: ${contact.name}, `}
      <a href={`mailto:${contact.email}`} className={TARGET}>
        {contact.email}
      </a>
      {[contact.phone, contact.hours].filter((part) => part !== '').map((part) => `, ${part}`)}
      {'. '}
      <Link to={settingsPath(scheme.id)} className={`${TARGET} print:hidden`}>
        About the works
      </Link>{' '}
      <Link to={PATHS.method} className={`${TARGET} ml-3 print:hidden`}>
        How we work it out
      </Link>
    </p>
  );
}
