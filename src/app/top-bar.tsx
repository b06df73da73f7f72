import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { SchemeAnswer } from '../../shared/schemas/schemes.ts';
import { Bar } from '../components/layout/bar.tsx';
import type { Tab } from '../components/layout/bar-tabs.tsx';
import { KeysHelp } from '../components/layout/keys-help.tsx';
import { PersonMenu } from '../components/layout/person-menu.tsx';
import { SchemeSwitcher } from '../components/layout/scheme-switcher.tsx';
import type { KeyHelp } from '../config/keys-at-hand.ts';
import { PATHS, schemePath } from '../config/paths.ts';
import { schemesQuery } from '../features/schemes/api/list-schemes.ts';
import { useSignOut } from '../features/session/api/sign-out.ts';
import { usePerson } from '../features/session/person-context.ts';
import { useHotkeys } from '../hooks/use-hotkeys.ts';
import { useKeysAtHand } from '../hooks/use-keys-at-hand.ts';
import { administratorLinks, isOwnerOnly, METHOD_LINK, schemeLinks } from './destinations.ts';
import { GoAnywhere } from './go-anywhere.tsx';
import { KEYS } from './keys.ts';

function tabsOf(scheme: SchemeAnswer | undefined, links: readonly Tab[]): readonly Tab[] {
  if (scheme !== undefined) {
    return [...schemeLinks(scheme), ...(isOwnerOnly(scheme) ? [] : [METHOD_LINK])];
  }
  return [{ to: PATHS.schemes, label: 'Schemes', end: true }, ...links, METHOD_LINK];
}

/** Whether a screen does something of its own with keys that otherwise work everywhere. */
function isTaken(atHand: readonly KeyHelp[], keys: readonly string[]): boolean {
  return atHand.some((help) => help.keys.join() === keys.join());
}

/** The bar with what is known of the person and, inside one, of the scheme. */
export function TopBar({ scheme }: { readonly scheme?: SchemeAnswer | undefined }) {
  const person = usePerson();
  const { data: schemes = [] } = useQuery(schemesQuery);
  const signOut = useSignOut();
  const isForOwner = scheme !== undefined && isOwnerOnly(scheme);
  const [showsKeys, setShowsKeys] = useState(false);
  const keysAtHand = useKeysAtHand();
  const links = administratorLinks(person);
  const others = schemes.filter(({ id, archivedAt }) => id !== scheme?.id && archivedAt === null);

  function showKeys() {
    setShowsKeys(true);
  }
  useHotkeys({ '?': showKeys });
  return (
    <Bar
      tabs={tabsOf(scheme, links)}
      scheme={scheme && <SchemeSwitcher current={scheme} others={others} pathOf={schemePath} />}
    >
      {!isForOwner && <GoAnywhere scheme={scheme} schemes={schemes} />}
      <PersonMenu
        name={person.name}
        links={[...(scheme === undefined ? [] : links), { to: PATHS.account, label: 'Account' }]}
        onShowKeys={showKeys}
        onSignOut={() => {
          signOut.mutate();
        }}
      />
      <KeysHelp
        open={showsKeys}
        help={[...keysAtHand, ...KEYS.filter(({ keys }) => !isTaken(keysAtHand, keys))]}
        onClose={() => {
          setShowsKeys(false);
        }}
      />
    </Bar>
  );
}
