import type { Sequelize } from 'sequelize';
import { initAlignment } from './alignment.ts';
import { initAuditEntry } from './audit-entry.ts';
import { initBackgroundFeature } from './background-feature.ts';
import { initBuilding } from './building.ts';
import { initBuildingFootprint } from './building-footprint.ts';
import { initMailboxLetter } from './mailbox-letter.ts';
import { initMembership } from './membership.ts';
import { initPerson } from './person.ts';
import { initRegisterChange } from './register-change.ts';
import { initRegisterView } from './register-view.ts';
import { initRegisterImport } from './register-import.ts';
import { initRunState } from './run-state.ts';
import { initRun } from './run.ts';
import { initSchemeGround } from './scheme-ground.ts';
import { initScheme } from './scheme.ts';
import { initSchemeRules } from './scheme-rules.ts';
import { initSingleUseLink } from './single-use-link.ts';
import { initVisit } from './visit.ts';
import { initVisitPhotographFile } from './visit-photograph-file.ts';
import { initVisitPhotograph } from './visit-photograph.ts';

/** Binds every model to a database. */
export function initModels(sequelize: Sequelize): void {
  initPerson(sequelize);
  initScheme(sequelize);
  initMembership(sequelize);
  initSchemeRules(sequelize);
  initSchemeGround(sequelize);
  initSingleUseLink(sequelize);
  initBuilding(sequelize);
  initBuildingFootprint(sequelize);
  initRegisterChange(sequelize);
  initRegisterView(sequelize);
  initAlignment(sequelize);
  initRun(sequelize);
  initRunState(sequelize);
  initVisit(sequelize);
  initVisitPhotograph(sequelize);
  initVisitPhotographFile(sequelize);
  initBackgroundFeature(sequelize);
  initRegisterImport(sequelize);
  initAuditEntry(sequelize);
  initMailboxLetter(sequelize);
}
