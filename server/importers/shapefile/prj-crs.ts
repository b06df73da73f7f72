import type { FileCrs } from '../source.ts';

const LONGEST = 10_000;
const WKT = /^(PROJ|GEO|LOCAL_?|COMP|BOUND|FITTED_?|VERT|BASE)\w*\s*[[(]/i;

type Said = { readonly crs: FileCrs | null; readonly note: string | undefined };

function unknown(reason: string): Said {
  return { crs: null, note: `${reason} Which system the shapes are in has to be stated.` };
}

/** What the .prj file beside the shapes says, and what is wrong with it. */
export function prjCrs(prj: Buffer | undefined): Said {
  if (prj === undefined) return unknown('The archive has no .prj file.');
  const text = prj.toString('utf8').replace(/^\uFEFF/, '').trim(); // prettier-ignore
  if (text.startsWith('<')) return unknown('The .prj file holds a web page instead of a system.');
  if (prj.length > LONGEST || !WKT.test(text)) {
    return unknown('The .prj file describes no system that can be read.');
  }
  const name = /"([^"]{1,200})"/.exec(text)?.[1] ?? 'a system without a name';
  return { crs: { wkt: text, said: name }, note: undefined };
}
