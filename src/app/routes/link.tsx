import { useQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import type { LinkPurpose } from '../../../shared/schemas/links.ts';
import { ButtonLink } from '../../components/ui/button-link.tsx';
import { QueryError } from '../../components/ui/query-error.tsx';
import { PATHS } from '../../config/paths.ts';
import { linkQuery } from '../../features/links/api/get-link.ts';
import { ChoosePasswordForm } from '../../features/links/components/choose-password-form.tsx';
import { Doorway } from '../../features/session/components/doorway.tsx';
import { isRefusal } from '../../lib/api-error.ts';

const TITLES: Readonly<Record<LinkPurpose, string>> = {
  invitation: 'Welcome',
  'password-reset': 'A new password',
};

function SpentLink() {
  return (
    <Doorway title="This link is spent">
      <div className="grid gap-4 text-roomy">
        <p>
          It has been used, or it is too old, or a newer one has taken its place. Nothing is lost.
        </p>
        <p className="text-small text-ink-2">
          If you have chosen a password, sign in with it. If you have forgotten it, send yourself a
          new link. If you were invited and have no password yet, ask whoever invited you to send
          the invitation again.
        </p>
        <div className="flex flex-wrap gap-2">
          <ButtonLink kind="main" to={PATHS.signIn}>
            Sign in
          </ButtonLink>
          <ButtonLink to={PATHS.forgotPassword}>Send me a new link</ButtonLink>
        </div>
      </div>
    </Doorway>
  );
}

export function LinkPage() {
  const { token = '' } = useParams();
  const navigate = useNavigate();
  const { data: link, error, refetch } = useQuery(linkQuery(token));
  if (isRefusal(error, 'link-spent', 'not-found')) return <SpentLink />;
  return (
    <Doorway title={link === undefined ? 'Your link' : TITLES[link.purpose]}>
      {error !== null && (
        <QueryError what="The link" error={error} onRetry={() => void refetch()} />
      )}
      {link !== undefined && (
        <ChoosePasswordForm
          token={token}
          link={link}
          onDone={() => void navigate(PATHS.schemes, { replace: true })}
        />
      )}
    </Doorway>
  );
}
