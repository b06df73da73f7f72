import { AppError } from '../errors.ts';
import { openCsv } from './csv/open-csv.ts';
import { foreignFormat } from './foreign-format.ts';
import { openGeopackage } from './geopackage/open-geopackage.ts';
import { openJson } from './json/open-json.ts';
import { openArchive } from './open-archive.ts';
import type { Source } from './source.ts';
import { utf8Bytes } from './text-bytes.ts';

const HEAD = 1024;

function begins(bytes: Buffer, words: string): boolean {
  return bytes.toString('latin1', 0, words.length) === words;
}

/** Whether a text is JSON by its first letter; a mark of sequences may stand before it. */
function isJson(head: string): boolean {
  return /^[\s\u001e]*[{[]/.test(head);
}

async function openPlain(bytes: Buffer, layer?: string): Promise<Source> {
  if (bytes.length === 0) throw new AppError('unreadable', 'The file is empty.');
  if (begins(bytes, 'SQLite format 3\0')) return openGeopackage(bytes, layer);
  if (begins(bytes, 'PK')) {
    throw new AppError('unreadable', 'The archive is refused: it holds an archive.');
  }
  const refusal = foreignFormat(bytes);
  if (refusal !== undefined) throw refusal;
  const text = utf8Bytes(bytes, 'windows-1252');
  const head = text.toString('utf8', 0, HEAD);
  // what is JSON by its first letter has to be in UTF-8, which its own reader sees to
  return isJson(head) ? openJson(bytes) : openCsv(text);
}

/** Finds out by what a file holds which format it has, never by its name, and opens it, or a layer of it. */
export async function openSource(bytes: Buffer, layer?: string): Promise<Source> {
  const open = (plain: Buffer) => openPlain(plain, layer);
  return begins(bytes, 'PK') ? openArchive(bytes, open) : open(bytes);
}
