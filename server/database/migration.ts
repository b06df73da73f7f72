/** What a migration works with: plain SQL, and the names of the two roles. */
export type MigrationContext = {
  readonly sql: (text: string) => Promise<void>;
  /** The role that serves, quoted. */
  readonly server: string;
};

/** One small step of the database, and back. */
export type Migration = {
  readonly up: (context: MigrationContext) => Promise<void>;
  readonly down: (context: MigrationContext) => Promise<void>;
};

/** SQL that makes a table immutable, for the serving role by privilege and for everyone by trigger. */
export function immutable(table: string, server: string): string {
  return `
    revoke update, delete, truncate on ${table} from ${server};
    create trigger ${table}_refuse_change before update or delete on ${table}
      for each row execute function refuse_change();
    create trigger ${table}_refuse_truncate before truncate on ${table}
      for each statement execute function refuse_change();
  `;
}
