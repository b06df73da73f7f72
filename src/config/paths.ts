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

/** The screens about owners, by the end of their address. */
export const OWNERS = {
  parties: 'parties',
  letters: 'letters',
  inbox: 'inbox',
  appointments: 'appointments',
  undertakings: 'undertakings',
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

/** Plans, sections and schedules on paper. */
export function evidencePath(schemeId: string): string {
  return `${schemePath(schemeId)}/evidence`;
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

/** Who owns, rents and manages the buildings, and what goes between them and the team. */
export function ownersPath(schemeId: string, part?: keyof typeof OWNERS): string {
  const path = `${schemePath(schemeId)}/owners`;
  return part === undefined ? path : `${path}/${OWNERS[part]}`;
}

/** What an owner is shown of their own buildings. */
export function homePath(schemeId: string): string {
  return `${schemePath(schemeId)}/home`;
}

/** A letter as its owner reads it. */
export function ownLetterPath(schemeId: string, letterId: string): string {
  return `${homePath(schemeId)}/letters/${letterId}`;
}

/** A party with all that is known of it. */
export function partyPath(schemeId: string, partyId: string): string {
  return `${ownersPath(schemeId, 'parties')}?party=${partyId}`;
}

/** Bringing parties in, and what was brought in before. */
export function partyImportsPath(schemeId: string): string {
  return `${ownersPath(schemeId, 'parties')}/imports`;
}

export function partyImportPath(schemeId: string, partyImportId: string): string {
  return `${partyImportsPath(schemeId)}/${partyImportId}`;
}

/** Where a batch is prepared that begins with the kind, the exceptions and the text of another. */
export function batchAgainPath(schemeId: string, batchId: string): string {
  return `${letterPagePath(schemeId, 'new')}?again=${batchId}`;
}

/** A batch of letters, or one of the screens beside them. */
export function letterPagePath(schemeId: string, page: string): string {
  return `${ownersPath(schemeId, 'letters')}/${page}`;
}

/** One matter of the inbox. */
export function matterPath(schemeId: string, matterId: string): string {
  return `${ownersPath(schemeId, 'inbox')}/${matterId}`;
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
