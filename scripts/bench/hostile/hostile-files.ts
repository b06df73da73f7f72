import { ARCHIVE_FILES } from './archive-files.ts';
import { DATABASE_FILES } from './database-files.ts';
import type { HostileFile } from './hostile-file.ts';
import { JSON_FILES } from './json-files.ts';
import { FOREIGN_FILES, TABLE_FILES } from './table-files.ts';

/** All files that have to be refused quickly and with words. */
export const HOSTILE_FILES: readonly HostileFile[] = [
  ...JSON_FILES,
  ...ARCHIVE_FILES,
  ...TABLE_FILES,
  ...DATABASE_FILES,
  ...FOREIGN_FILES,
];
