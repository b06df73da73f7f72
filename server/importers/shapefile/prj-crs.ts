import { codeOfName } from '../named-crs.ts';
import type { FileCrs } from '../source.ts';
import { utf8Bytes } from '../text-bytes.ts';

const LONGEST = 10_000;
const WKT = /^(PROJ|GEO|LOCAL_?|COMP|BOUND|FITTED_?|VERT|BASE)\w*\s*[[(]/i;

/** A description by parameters, one after another. */
const PROJ4 = /^\+(proj|init)=/i;

type Said = { readonly crs: FileCrs | null; readonly note: string | undefined };

function unknown(reason: string): Said {
  return { crs: null, note: `${reason} Which system the shapes are in has to be stated.` };
}

/** The letters of the file; none where it holds no text. */
function textOf(prj: Buffer): string {
  try {
    return utf8Bytes(prj, 'windows-1252').toString('utf8').trim();
  } catch {
    return '';
  }
}

/** What the .prj file beside the shapes says, and what is wrong with it. */
export function prjCrs(prj: Buffer | undefined): Said {
  if (prj === undefined) return unknown('The archive has no .prj file.');
  const text = textOf(prj);
  if (text.startsWith('<')) return unknown('The .prj file holds a web page instead of a system.');
  if (text.length <= LONGEST && PROJ4.test(text)) {
    const code = codeOfName(/\+init=(epsg:\d+)/i.exec(text)?.[1] ?? '');
    const said = text.slice(0, 200);
    return { crs: { ...(code !== undefined && { code }), wkt: text, said }, note: undefined };
  }
  const code = text.length < 100 ? codeOfName(text) : undefined;
  if (code !== undefined) return { crs: { code, said: text }, note: undefined };
  if (prj.length > LONGEST || !WKT.test(text)) {
    return unknown('The .prj file describes no system that can be read.');
  }
  const name = /"([^"]{1,200})"/.exec(text)?.[1] ?? 'a system without a name';
  return { crs: { wkt: text, said: name }, note: undefined };
}
