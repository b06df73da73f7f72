export type Cluster = {
  readonly port: number;
  /** Runs SQL as the superuser and gives what psql prints. */
  readonly sql: (database: string, text: string) => string;
  readonly ownerUrl: (database: string) => string;
  readonly serverUrl: (database: string) => string;
  readonly superUrl: (database: string) => string;
  readonly ensureDatabase: (database: string) => void;
  readonly stop: () => number | null;
};
export function startCluster(options: { home: string; fast?: boolean }): Promise<Cluster>;
export function removeCluster(options: { home: string }): void;
