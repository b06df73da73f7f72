import type { RouteObject } from 'react-router-dom';
import { OWNERS, PATHS, SETTINGS } from '../config/paths.ts';
import { AdministratorsOnly } from './administrators-only.tsx';
import { FramedPages } from './framed.tsx';
import { PageError } from './page-error.tsx';
import { Root } from './root.tsx';
import { NotFoundPage } from './routes/not-found.tsx';
import { SchemeFrame } from './scheme-frame.tsx';
import { SchemeStart } from './scheme-start.tsx';
import { SignedIn } from './signed-in.tsx';

const forAnyone: RouteObject[] = [
  {
    path: PATHS.signIn,
    lazy: async () => ({ Component: (await import('./routes/sign-in.tsx')).SignInPage }),
  },
  {
    path: PATHS.forgotPassword,
    lazy: async () => ({
      Component: (await import('./routes/forgot-password.tsx')).ForgotPasswordPage,
    }),
  },
  {
    path: PATHS.link,
    lazy: async () => ({ Component: (await import('./routes/link.tsx')).LinkPage }),
  },
];

const forAdministrators: RouteObject[] = [
  {
    path: PATHS.newScheme,
    lazy: async () => ({ Component: (await import('./routes/new-scheme.tsx')).NewSchemePage }),
  },
  {
    path: PATHS.people,
    lazy: async () => ({ Component: (await import('./routes/people.tsx')).PeoplePage }),
  },
  {
    path: PATHS.audit,
    lazy: async () => ({ Component: (await import('./routes/audit.tsx')).AuditPage }),
  },
  {
    path: `${PATHS.mailbox}/:letterId?`,
    lazy: async () => ({ Component: (await import('./routes/mailbox.tsx')).MailboxPage }),
  },
];

const settings: RouteObject[] = [
  {
    index: true,
    lazy: async () => ({
      Component: (await import('./routes/settings-description.tsx')).DescriptionPage,
    }),
  },
  {
    path: SETTINGS.people,
    lazy: async () => ({ Component: (await import('./routes/settings-people.tsx')).MembersPage }),
  },
  {
    path: SETTINGS.rules,
    lazy: async () => ({ Component: (await import('./routes/settings-rules.tsx')).RulesPage }),
  },
  {
    path: SETTINGS.background,
    lazy: async () => ({
      Component: (await import('./routes/settings-background.tsx')).BackgroundPage,
    }),
  },
  {
    path: SETTINGS.ground,
    lazy: async () => ({ Component: (await import('./routes/settings-ground.tsx')).GroundPage }),
  },
];

const owners: RouteObject[] = [
  {
    index: true,
    lazy: async () => ({ Component: (await import('./routes/owners.tsx')).OwnersStart }),
  },
  {
    path: OWNERS.parties,
    lazy: async () => ({
      Component: (await import('../features/parties/parties-page.tsx')).PartiesPage,
    }),
  },
  {
    path: `${OWNERS.parties}/imports`,
    lazy: async () => ({
      Component: (await import('../features/parties/party-imports-page.tsx')).PartyImportsPage,
    }),
  },
  {
    path: `${OWNERS.parties}/imports/:partyImportId`,
    lazy: async () => ({
      Component: (await import('../features/parties/party-import-page.tsx')).PartyImportPage,
    }),
  },
  {
    path: OWNERS.letters,
    lazy: async () => ({
      Component: (await import('../features/letters/letters-page.tsx')).LettersPage,
    }),
  },
  {
    path: `${OWNERS.letters}/new`,
    lazy: async () => ({
      Component: (await import('../features/letters/new-batch-page.tsx')).NewBatchPage,
    }),
  },
  {
    path: `${OWNERS.letters}/templates`,
    lazy: async () => ({
      Component: (await import('../features/letters/templates-page.tsx')).TemplatesPage,
    }),
  },
  {
    path: `${OWNERS.letters}/settings`,
    lazy: async () => ({
      Component: (await import('../features/letters/letter-settings-page.tsx')).LetterSettingsPage,
    }),
  },
  {
    path: `${OWNERS.letters}/:batchId`,
    lazy: async () => ({
      Component: (await import('../features/letters/batch-page.tsx')).BatchPage,
    }),
  },
  {
    path: OWNERS.inbox,
    lazy: async () => ({
      Component: (await import('../features/matters/inbox-page.tsx')).InboxPage,
    }),
  },
  {
    path: `${OWNERS.inbox}/:matterId`,
    lazy: async () => ({
      Component: (await import('../features/matters/matter-page.tsx')).MatterPage,
    }),
  },
  {
    path: OWNERS.appointments,
    lazy: async () => ({
      Component: (await import('../features/appointments/appointments-page.tsx')).AppointmentsPage,
    }),
  },
  {
    path: OWNERS.undertakings,
    lazy: async () => ({
      Component: (await import('../features/undertakings/undertakings-page.tsx')).UndertakingsPage,
    }),
  },
];

/** Both at once: from one of them the other may be opened where there is no network. */
async function visitPages() {
  const [{ VisitPage }, { VisitsPage }] = await Promise.all([
    import('../features/visits/visit-page.tsx'),
    import('../features/visits/visits-page.tsx'),
  ]);
  return { VisitPage, VisitsPage };
}

const ofScheme: RouteObject[] = [
  { index: true, Component: SchemeStart },
  {
    path: 'home',
    lazy: async () => ({ Component: (await import('../features/own/own-page.tsx')).OwnPage }),
  },
  {
    path: 'home/letters/:ownLetterId',
    lazy: async () => ({
      Component: (await import('../features/own/own-letter-page.tsx')).OwnLetterPage,
    }),
  },
  {
    path: 'plan',
    lazy: async () => ({ Component: (await import('../features/plan/plan-page.tsx')).PlanPage }),
  },
  {
    path: 'buildings/:buildingId/sheet',
    lazy: async () => ({ Component: (await import('../features/sheet/sheet-page.tsx')).SheetPage }),
  },
  {
    path: 'buildings/:buildingId/visit',
    lazy: async () => ({ Component: (await visitPages()).VisitPage }),
  },
  {
    path: 'measures',
    lazy: async () => ({
      Component: (await import('../features/measures/measures-page.tsx')).MeasuresPage,
    }),
  },
  {
    path: 'evidence',
    lazy: async () => ({
      Component: (await import('../features/evidence/evidence-page.tsx')).EvidencePage,
    }),
  },
  { path: 'visits', lazy: async () => ({ Component: (await visitPages()).VisitsPage }) },
  {
    path: 'register/imports',
    lazy: async () => ({ Component: (await import('./routes/imports.tsx')).ImportsPage }),
  },
  {
    path: 'register/imports/:importId',
    lazy: async () => ({ Component: (await import('./routes/import.tsx')).ImportPage }),
  },
  {
    path: 'register',
    lazy: async () => ({
      Component: (await import('../features/register/register-page.tsx')).RegisterPage,
    }),
  },
  {
    path: 'owners',
    lazy: async () => ({ Component: (await import('./routes/owners.tsx')).OwnersPage }),
    children: owners,
  },
  {
    path: 'settings',
    lazy: async () => ({ Component: (await import('./routes/settings.tsx')).SettingsPage }),
    children: settings,
  },
];

const outsideOfSchemes: RouteObject[] = [
  {
    index: true,
    lazy: async () => ({ Component: (await import('./routes/schemes.tsx')).SchemesPage }),
  },
  {
    path: PATHS.account,
    lazy: async () => ({ Component: (await import('./routes/account.tsx')).AccountPage }),
  },
  {
    path: PATHS.method,
    lazy: async () => ({
      Component: (await import('../features/method/method-page.tsx')).MethodPage,
    }),
  },
  {
    path: PATHS.whatIf,
    lazy: async () => ({
      Component: (await import('../features/method/what-if-page.tsx')).WhatIfPage,
    }),
  },
  { Component: AdministratorsOnly, children: forAdministrators },
  { path: '*', Component: NotFoundPage },
];

const forSignedIn: RouteObject[] = [
  { Component: FramedPages, children: outsideOfSchemes },
  { path: '/schemes/:schemeId', Component: SchemeFrame, children: ofScheme },
];

/** Every page by its address; each is fetched when it is first opened. */
export const ROUTES: readonly RouteObject[] = [
  {
    Component: Root,
    ErrorBoundary: PageError,
    HydrateFallback: () => null,
    children: [...forAnyone, { Component: SignedIn, children: forSignedIn }],
  },
];
