import { AppError } from '../errors.ts';
import type { ZipEntry } from './zip-entries.ts';

/** What an archive may unpack to: as much as a computer can hold some times over. */
const MOST_UNPACKED = 400 * 1024 * 1024;
/** How many times smaller than itself a large file may be packed; tables full of blanks come near it. */
const MOST_TIMES = 250;
const SMALL = 1024 * 1024;
const DEEPEST = 5;

function nameFault(name: string): string | undefined {
  const parts = name.split('/');
  if (/[\\\0:]/.test(name) || name.startsWith('/') || parts.includes('..')) {
    return 'has a name that leads out of the archive';
  }
  if (parts.length > DEEPEST) return 'lies too deep in folders';
  return /\.(zip|7z|rar|gz|tgz|bz2|xz|tar)$/i.test(name)
    ? 'is an archive in the archive'
    : undefined;
}

function entryFault({ name, packed, unpacked }: ZipEntry): string | undefined {
  if (unpacked > SMALL && unpacked > packed * MOST_TIMES) return 'unpacks to far too much';
  return nameFault(name);
}

/** Refuses an archive that would unpack to far too much, or out of its place, before anything is unpacked. */
export function checkZip(entries: readonly ZipEntry[], size: number): void {
  for (const entry of entries) {
    const fault = entryFault(entry);
    if (fault !== undefined) {
      throw new AppError('unreadable', `The archive is refused: "${entry.name}" ${fault}.`);
    }
  }
  const names = new Set(entries.map(({ name }) => name.toLowerCase()));
  const packed = entries.reduce((sum, entry) => sum + entry.packed, 0);
  if (names.size < entries.length || packed > size) {
    throw new AppError('unreadable', 'The archive is refused: its files overlap.');
  }
  if (entries.reduce((sum, entry) => sum + entry.unpacked, 0) > MOST_UNPACKED) {
    throw new AppError('too-large', 'The archive unpacks to more than 400 MB.');
  }
}
