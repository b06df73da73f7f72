/** The addresses of the pages, each written once. */
export const PATHS = {
  schemes: '/',
  signIn: '/sign-in',
  forgotPassword: '/forgot-password',
  link: '/links/:token',
  newScheme: '/schemes/new',
  people: '/people',
  audit: '/audit',
  mailbox: '/mailbox',
  account: '/account',
  method: '/method',
  whatIf: '/method/what-if',
} as const;

/** The parts of a scheme's settings, by the end of their address. */
export const SETTINGS = {
  description: '',
  people: 'people',
  rules: 'rules',
  background: 'background',
  ground: 'ground',
} as const;

export function schemePath(schemeId: string): string {
  return `/schemes/${schemeId}`;
}

export function planPath(schemeId: string): string {
  return `${schemePath(schemeId)}/plan`;
}

/** The plan with a building selected. */
export function buildingPath(schemeId: string, buildingId: number): string {
  return `${planPath(schemeId)}?building=${buildingId}`;
}

/** One building in one run; the newest complete one where none is named. */
export function sheetPath(schemeId: string, buildingId: number, runId?: string): string {
  const path = `${schemePath(schemeId)}/buildings/${buildingId}/sheet`;
  return runId === undefined ? path : `${path}?run=${runId}`;
}

/** What protects buildings. */
export function measuresPath(schemeId: string): string {
  return `${schemePath(schemeId)}/measures`;
}

/** Which buildings are to be visited, for the phone. */
export function visitsPath(schemeId: string): string {
  return `${schemePath(schemeId)}/visits`;
}

/** Recording a visit of one building. */
export function visitPath(schemeId: string, buildingId: number): string {
  return `${schemePath(schemeId)}/buildings/${buildingId}/visit`;
}

export function registerPath(schemeId: string): string {
  return `${schemePath(schemeId)}/register`;
}

/** Bringing buildings in, and what was brought in before. */
export function importsPath(schemeId: string): string {
  return `${registerPath(schemeId)}/imports`;
}

export function importPath(schemeId: string, importId: string): string {
  return `${importsPath(schemeId)}/${importId}`;
}

export function settingsPath(
  schemeId: string,
  part: keyof typeof SETTINGS = 'description',
): string {
  const end = SETTINGS[part];
  return `${schemePath(schemeId)}/settings${end === '' ? '' : `/${end}`}`;
}

export function letterPath(letterId: number): string {
  return `${PATHS.mailbox}/${letterId}`;
}
