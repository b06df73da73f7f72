import { Page } from '../../components/layout/page.tsx';
import { Facts } from '../../components/ui/facts.tsx';
import { Panel } from '../../components/ui/panel.tsx';
import { ChangePasswordForm } from '../../features/session/components/change-password-form.tsx';
import { SignOutEverywhere } from '../../features/session/components/sign-out-everywhere.tsx';
import { usePerson } from '../../features/session/person-context.ts';

export function AccountPage() {
  const { name, email, isAdministrator } = usePerson();
  return (
    <Page title="Account">
      <div className="max-w-[620px]">
        <Facts
          facts={[
            ['Name', name],
            ['E-mail', email],
            ...(isAdministrator ? ([['Is', 'administrator']] as const) : []),
          ]}
        />
        <Panel title="Password">
          <ChangePasswordForm email={email} />
        </Panel>
        <Panel title="Where you are signed in">
          <SignOutEverywhere />
        </Panel>
      </div>
    </Page>
  );
}
