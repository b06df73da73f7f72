import { Sequelize } from 'sequelize';
import { Umzug, SequelizeStorage } from 'umzug';
import type { Migration, MigrationContext } from './migration.ts';
import { migration as roles } from './migrations/01-roles.ts';
import { migration as people } from './migrations/02-people.ts';
import { migration as schemes } from './migrations/03-schemes.ts';
import { migration as audit } from './migrations/04-audit.ts';
import { migration as buildings } from './migrations/05-buildings.ts';
import { migration as background } from './migrations/06-background.ts';
import { migration as mailbox } from './migrations/07-mailbox.ts';
import { migration as buildingSearch } from './migrations/08-building-search.ts';
import { migration as footprints } from './migrations/09-footprints.ts';
import { migration as register } from './migrations/10-register.ts';
import { migration as registerChanges } from './migrations/11-register-changes.ts';
import { migration as registerViews } from './migrations/12-register-views.ts';
import { migration as imports } from './migrations/13-imports.ts';
import { migration as ground } from './migrations/14-ground.ts';
import { migration as peopleShutOut } from './migrations/15-people-shut-out.ts';
import { migration as schemeNames } from './migrations/16-scheme-names.ts';
import { migration as alignments } from './migrations/17-alignments.ts';
import { migration as registerOrder } from './migrations/18-register-order.ts';
import { migration as jobQueue } from './migrations/19-job-queue.ts';
import { migration as runs } from './migrations/20-runs.ts';
import { migration as importChoices } from './migrations/21-import-choices.ts';
import { migration as decisions } from './migrations/22-decisions.ts';
import { migration as visits } from './migrations/23-visits.ts';
import { migration as scores } from './migrations/24-scores.ts';
import { migration as measures } from './migrations/25-measures.ts';
import { migration as parties } from './migrations/26-parties.ts';
import { migration as letters } from './migrations/27-letters.ts';
import { migration as matters } from './migrations/28-matters.ts';
import { migration as evidence } from './migrations/29-evidence.ts';
import { migration as ownTextOfLetters } from './migrations/30-own-text-of-letters.ts';
import { migration as lettersKept } from './migrations/31-letters-kept.ts';
import { migration as accountMails } from './migrations/32-account-mails.ts';
import { migration as shafts } from './migrations/33-shafts.ts';
import { migration as runOrders } from './migrations/34-run-orders.ts';

/** In the order in which they are applied; a new one goes to the end. */
const MIGRATIONS: Readonly<Record<string, Migration>> = {
  '01-roles': roles,
  '02-people': people,
  '03-schemes': schemes,
  '04-audit': audit,
  '05-buildings': buildings,
  '06-background': background,
  '07-mailbox': mailbox,
  '08-building-search': buildingSearch,
  '09-footprints': footprints,
  '10-register': register,
  '11-register-changes': registerChanges,
  '12-register-views': registerViews,
  '13-imports': imports,
  '14-ground': ground,
  '15-people-shut-out': peopleShutOut,
  '16-scheme-names': schemeNames,
  '17-alignments': alignments,
  '18-register-order': registerOrder,
  '19-job-queue': jobQueue,
  '20-runs': runs,
  '21-import-choices': importChoices,
  '22-decisions': decisions,
  '23-visits': visits,
  '24-scores': scores,
  '25-measures': measures,
  '26-parties': parties,
  '27-letters': letters,
  '28-matters': matters,
  '29-evidence': evidence,
  '30-own-text-of-letters': ownTextOfLetters,
  '31-letters-kept': lettersKept,
  '32-account-mails': accountMails,
  '33-shafts': shafts,
  '34-run-orders': runOrders,
};

/** Opens the migrations of a database as its owner; `serverUrl` names the role that serves. */
export function openMigrations(ownerUrl: string, serverUrl: string) {
  const database = new Sequelize(ownerUrl, { dialect: 'postgres', logging: false });
  const server = `"${decodeURIComponent(new URL(serverUrl).username).replaceAll('"', '""')}"`;
  const umzug = new Umzug({
    migrations: Object.entries(MIGRATIONS).map(([name, { up, down }]) => ({
      name,
      up: ({ context }: { context: MigrationContext }) => up(context),
      down: ({ context }: { context: MigrationContext }) => down(context),
    })),
    context: {
      server,
      sql: async (text) => {
        await database.query(text);
      },
    } satisfies MigrationContext,
    storage: new SequelizeStorage({ sequelize: database, tableName: 'migrations' }),
    logger: undefined,
  });
  return {
    up: async () => (await umzug.up()).map(({ name }) => name),
    down: async () => (await umzug.down({ to: 0 })).map(({ name }) => name),
    close: () => database.close(),
  };
}
