import type { Sequelize } from 'sequelize';
import { initAuditEntry } from './audit-entry.ts';
import { initBackgroundFeature } from './background-feature.ts';
import { initBuilding } from './building.ts';
import { initMailboxLetter } from './mailbox-letter.ts';
import { initMembership } from './membership.ts';
import { initPerson } from './person.ts';
import { initScheme } from './scheme.ts';
import { initSchemeRules } from './scheme-rules.ts';
import { initSingleUseLink } from './single-use-link.ts';

/** Binds every model to a database. */
export function initModels(sequelize: Sequelize): void {
  initPerson(sequelize);
  initScheme(sequelize);
  initMembership(sequelize);
  initSchemeRules(sequelize);
  initSingleUseLink(sequelize);
  initBuilding(sequelize);
  initBackgroundFeature(sequelize);
  initAuditEntry(sequelize);
  initMailboxLetter(sequelize);
}
