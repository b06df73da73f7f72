import { findFileCrs } from '../crs/file-crs.ts';
import { isProj4, matchProj4 } from '../crs/match-proj4.ts';
import { matchWkt } from '../crs/match-wkt.ts';
import type { FileCrs as FileSays } from '../importers/source.ts';
import type { SaidPlace } from '../models/register-import.ts';
import { systemName } from './describe-place.ts';

type Found = Pick<SaidPlace, 'crs' | 'candidates'>;

async function found({ code, wkt }: FileSays): Promise<Found> {
  const listed = code === undefined ? undefined : await findFileCrs(code);
  if (listed !== undefined && 'crs' in listed) return { crs: listed.crs.code, candidates: [] };
  if (wkt === undefined) return { crs: null, candidates: [] };
  const match = isProj4(wkt) ? await matchProj4(wkt) : await matchWkt(wkt);
  return { crs: match.code, candidates: match.candidates };
}

function shortened(said: string): string {
  const line = said.replaceAll(/\p{Cc}+/gu, ' ').trim();
  return line.length > 120 ? `${line.slice(0, 120)}…` : line;
}

/** What a file's words about its system mean, where they can be understood. */
export async function findPlace(
  says: FileSays | null,
  isByFormat: boolean,
  notes: readonly string[],
): Promise<SaidPlace> {
  const noted = (sentence: string) => [...notes, sentence].join(' ');
  if (says === null) {
    const said = noted('The file does not say which system its coordinates are in.');
    return { crs: null, from: 'nobody', said, candidates: [], axes: null };
  }
  const { crs, candidates } = await found(says);
  const quoted = `“${shortened(says.said)}”`;
  if (crs === null) {
    const said = noted(`The file names its system ${quoted}, which fits no one system known here.`);
    return { crs, from: 'nobody', said, candidates, axes: null };
  }
  const name = await systemName(crs);
  const said = isByFormat
    ? `A file of this kind that says nothing else is in ${name}.`
    : `The file says that it is in ${name}.`;
  const from = isByFormat ? 'the format' : 'the file';
  return { crs, from, said: noted(said), candidates, axes: null };
}
