import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { PATHS, SETTINGS } from '../config/paths.ts';
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
    lazy: { Component: async () => (await import('./routes/sign-in.tsx')).SignInPage },
  },
  {
    path: PATHS.forgotPassword,
    lazy: {
      Component: async () => (await import('./routes/forgot-password.tsx')).ForgotPasswordPage,
    },
  },
  {
    path: PATHS.link,
    lazy: { Component: async () => (await import('./routes/link.tsx')).LinkPage },
  },
];

const forAdministrators: RouteObject[] = [
  {
    path: PATHS.newScheme,
    lazy: { Component: async () => (await import('./routes/new-scheme.tsx')).NewSchemePage },
  },
  {
    path: PATHS.people,
    lazy: { Component: async () => (await import('./routes/people.tsx')).PeoplePage },
  },
  {
    path: PATHS.audit,
    lazy: { Component: async () => (await import('./routes/audit.tsx')).AuditPage },
  },
  {
    path: `${PATHS.mailbox}/:letterId?`,
    lazy: { Component: async () => (await import('./routes/mailbox.tsx')).MailboxPage },
  },
];

const settings: RouteObject[] = [
  {
    index: true,
    lazy: {
      Component: async () => (await import('./routes/settings-description.tsx')).DescriptionPage,
    },
  },
  {
    path: SETTINGS.people,
    lazy: { Component: async () => (await import('./routes/settings-people.tsx')).MembersPage },
  },
  {
    path: SETTINGS.rules,
    lazy: { Component: async () => (await import('./routes/settings-rules.tsx')).RulesPage },
  },
  {
    path: SETTINGS.background,
    lazy: {
      Component: async () => (await import('./routes/settings-background.tsx')).BackgroundPage,
    },
  },
];

const ofScheme: RouteObject[] = [
  { index: true, Component: SchemeStart },
  {
    path: 'plan',
    lazy: { Component: async () => (await import('../features/plan/plan-page.tsx')).PlanPage },
  },
  {
    path: 'settings',
    lazy: { Component: async () => (await import('./routes/settings.tsx')).SettingsPage },
    children: settings,
  },
];

const outsideOfSchemes: RouteObject[] = [
  {
    index: true,
    lazy: { Component: async () => (await import('./routes/schemes.tsx')).SchemesPage },
  },
  {
    path: PATHS.account,
    lazy: { Component: async () => (await import('./routes/account.tsx')).AccountPage },
  },
  { Component: AdministratorsOnly, children: forAdministrators },
  { path: '*', Component: NotFoundPage },
];

const forSignedIn: RouteObject[] = [
  { Component: FramedPages, children: outsideOfSchemes },
  { path: '/schemes/:schemeId', Component: SchemeFrame, children: ofScheme },
];

/** Every page by its address; each is fetched when it is first opened. */
export const router = createBrowserRouter([
  {
    Component: Root,
    ErrorBoundary: PageError,
    HydrateFallback: () => null,
    children: [...forAnyone, { Component: SignedIn, children: forSignedIn }],
  },
]);
