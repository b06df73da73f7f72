import { alignmentRoutes } from './alignments.ts';
import { appointmentRoutes } from './appointments.ts';
import { auditRoutes } from './audit.ts';
import { backgroundRoutes } from './background.ts';
import { buildingOutlineRoutes } from './building-outlines.ts';
import { buildingRoutes } from './buildings.ts';
import { crsRoutes } from './crs.ts';
import { decisionRoutes } from './decisions.ts';
import type { Route } from './define-route.ts';
import { evidenceRoutes } from './evidence.ts';
import { groundRoutes } from './ground.ts';
import { importRoutes } from './imports.ts';
import { letterRoutes } from './letters.ts';
import { letterTemplateRoutes } from './letter-templates.ts';
import { linkRoutes } from './links.ts';
import { mailboxRoutes } from './mailbox.ts';
import { matterRoutes } from './matters.ts';
import { measureRoutes } from './measures.ts';
import { memberRoutes } from './members.ts';
import { ownRoutes } from './own.ts';
import { ownMatterRoutes } from './own-matters.ts';
import { partyRoutes } from './parties.ts';
import { partyImportRoutes } from './party-imports.ts';
import { peopleRoutes } from './people.ts';
import { registerChangeRoutes } from './register-changes.ts';
import { registerViewRoutes } from './register-views.ts';
import { registerRoutes } from './register.ts';
import { rulesRoutes } from './rules.ts';
import { runRoutes } from './runs.ts';
import { schemeRoutes } from './schemes.ts';
import { sessionRoutes } from './session.ts';
import { tileRoutes } from './tiles.ts';
import { undertakingRoutes } from './undertakings.ts';
import { visitRoutes } from './visits.ts';
import { waitingRoutes } from './waiting.ts';

/** Every route there is; a test walks this list for every role. */
export const ROUTES: readonly Route[] = [
  ...sessionRoutes,
  ...linkRoutes,
  ...peopleRoutes,
  ...auditRoutes,
  ...mailboxRoutes,
  ...schemeRoutes,
  ...memberRoutes,
  ...rulesRoutes,
  ...crsRoutes,
  ...backgroundRoutes,
  ...buildingRoutes,
  ...buildingOutlineRoutes,
  ...registerRoutes,
  ...registerChangeRoutes,
  ...registerViewRoutes,
  ...groundRoutes,
  ...alignmentRoutes,
  ...runRoutes,
  ...evidenceRoutes,
  ...decisionRoutes,
  ...measureRoutes,
  ...letterTemplateRoutes,
  ...letterRoutes,
  ...matterRoutes,
  ...ownMatterRoutes,
  ...appointmentRoutes,
  ...undertakingRoutes,
  ...importRoutes,
  ...partyRoutes,
  ...partyImportRoutes,
  ...tileRoutes,
  ...visitRoutes,
  ...ownRoutes,
  ...waitingRoutes,
];
