import type { SchemeAnswer } from '../../shared/schemas/schemes.ts';
import type { Destination } from '../components/layout/go-to.tsx';
import {
  evidencePath,
  homePath,
  measuresPath,
  ownersPath,
  PATHS,
  planPath,
  registerPath,
  settingsPath,
  visitsPath,
} from '../config/paths.ts';
import { can } from '../features/schemes/can.ts';
import type { SignedInPerson } from '../features/session/person-context.ts';

type Link = { readonly to: string; readonly label: string };

/** The administrator's screens outside of schemes; the mailbox is in the demo only. */
export function administratorLinks({ isAdministrator, demo }: SignedInPerson): readonly Link[] {
  if (!isAdministrator) return [];
  const mailbox = { to: PATHS.mailbox, label: 'Mailbox' };
  return [
    { to: PATHS.people, label: 'People' },
    { to: PATHS.audit, label: 'Audit' },
    ...(demo ? [mailbox] : []),
  ];
}

/** Whether a person has nothing to do in a scheme but with their own buildings. */
export function isOwnerOnly(scheme: SchemeAnswer): boolean {
  return can(scheme, 'readOwnBuildings') && !can(scheme, 'readRegister');
}

/** The screens of a scheme that the person may see. */
export function schemeLinks(scheme: SchemeAnswer): readonly Link[] {
  const own = { to: homePath(scheme.id), label: 'My building' };
  if (isOwnerOnly(scheme)) return [own];
  const ofRegister = [
    { to: planPath(scheme.id), label: 'Plan' },
    { to: registerPath(scheme.id), label: 'Register' },
  ];
  return [
    ...(can(scheme, 'readOwnBuildings') ? [own] : []),
    ...(can(scheme, 'readRegister') ? ofRegister : []),
    ...(can(scheme, 'readDecisions') ? [{ to: measuresPath(scheme.id), label: 'Measures' }] : []),
    ...(can(scheme, 'recordVisits') ? [{ to: visitsPath(scheme.id), label: 'Visits' }] : []),
    ...(can(scheme, 'readUndertakings') ? [{ to: ownersPath(scheme.id), label: 'Owners' }] : []),
    ...(can(scheme, 'readEvidence') ? [{ to: evidencePath(scheme.id), label: 'Evidence' }] : []),
    { to: settingsPath(scheme.id), label: can(scheme, 'readRules') ? 'Settings' : 'Description' },
  ];
}

function asDestinations(links: readonly Link[], note: string): Destination[] {
  return links.map(({ to, label }) => ({ to, title: label, note }));
}

/** How figures are worked out, for everybody, wherever they are. */
export const METHOD_LINK: Link = { to: PATHS.method, label: 'Method' };

/** Everywhere that the person can go from anywhere; the scheme at hand comes first. */
export function destinationsOf(
  person: SignedInPerson,
  schemes: readonly SchemeAnswer[],
  currentId: string | undefined,
): Destination[] {
  const here = schemes.filter(({ id }) => id === currentId);
  const elsewhere = schemes.filter(({ id }) => id !== currentId);
  return [
    ...here.flatMap((scheme) => asDestinations(schemeLinks(scheme), scheme.name)),
    { to: PATHS.schemes, title: 'Schemes', note: 'what waits for you' },
    ...elsewhere.flatMap((scheme) => asDestinations(schemeLinks(scheme), scheme.name)),
    ...asDestinations(administratorLinks(person), 'administration'),
    { to: PATHS.method, title: 'Method', note: 'formulas, sources, checks' },
    { to: PATHS.whatIf, title: 'What-if on one wall', note: 'method' },
    { to: PATHS.account, title: 'Account', note: 'password and sessions' },
  ];
}

/** The destinations that every word of a query stands in. */
export function meantBy(query: string, destinations: readonly Destination[]): Destination[] {
  const words = query.toLowerCase().split(/\s+/);
  return destinations.filter(({ title, note }) => {
    const text = `${title} ${note}`.toLowerCase();
    return words.every((word) => text.includes(word));
  });
}
