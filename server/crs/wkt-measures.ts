import parse from 'wkt-parser';
import { z } from 'zod';

/** What tells one system from another, as its WKT says it. */
export type WktMeasures = {
  readonly name: string;
  /** The EPSG number that it gives itself. */
  readonly code: number | undefined;
  readonly projection: string;
  readonly datum: string;
  /** By what they mean, angles in radians, lengths in the system's unit. */
  readonly numbers: Readonly<Record<(typeof WKT_NUMBERS)[number], number | undefined>>;
};

/** What a system is measured by. */
export const WKT_NUMBERS = ['a', 'rf', 'lat0', 'lat1', 'lat2', 'long0', 'alpha', 'k0', 'x0', 'y0', 'to_meter'] as const; // prettier-ignore

/** A system's description is some thousand letters; what is longer is something else. */
const LONGEST = 20_000;

const numberSchema = z.number().optional().catch(undefined);
const partSchema = z.object({
  name: z.string().catch(''),
  title: z.string().optional().catch(undefined),
  projName: z.string(),
  datumCode: z.string().optional().catch(undefined),
  longc: numberSchema,
  GEOGCS: z.object({ DATUM: z.object({ name: z.string() }) }).optional().catch(undefined), // prettier-ignore
  DATUM: z.object({ name: z.string() }).optional().catch(undefined),
  a: numberSchema, rf: numberSchema, lat0: numberSchema, lat1: numberSchema, lat2: numberSchema,
  long0: numberSchema, alpha: numberSchema, k0: numberSchema, x0: numberSchema, y0: numberSchema,
  to_meter: numberSchema,
}); // prettier-ignore
/** A system with heights holds the flat one that counts. */
const wholeSchema = z.union([
  z.object({ PROJCS: partSchema }).transform(({ PROJCS }) => PROJCS),
  z.object({ GEOGCS: partSchema, type: z.literal('COMPD_CS') }).transform(({ GEOGCS }) => GEOGCS),
  partSchema,
]);

/** One way of projecting has many names. */
const PROJECTIONS: Readonly<Record<string, string>> = {
  gausskruger: 'transversemercator',
  universaltransversemercator: 'transversemercator',
  doublestereographic: 'obliquestereographic',
  lambertconformalconic1sp: 'lambertconformalconic',
  lambertconformalconic2sp: 'lambertconformalconic',
  lambertconicconformal1sp: 'lambertconformalconic',
  lambertconicconformal2sp: 'lambertconformalconic',
  hotineobliquemercatorazimuthcenter: 'obliquemercator',
  hotineobliquemercatorazimuthnaturalorigin: 'hotineobliquemercator',
  hotineobliquemercatorvariantb: 'obliquemercator',
  rectifiedskeworthomorphiccenter: 'obliquemercator',
  swissobliquecylindrical: 'obliquemercator',
  swissobliquemercator: 'obliquemercator',
  albersequalareaconic: 'albersconicequalarea',
  albers: 'albersconicequalarea',
  cassini: 'cassinisoldner',
};

function folded(text: string): string {
  return text.toLowerCase().replaceAll(/[^a-z0-9]+/g, '');
}

function projectionOf(name: string): string {
  return PROJECTIONS[folded(name)] ?? folded(name);
}

/** What a WKT says of its system; undefined where it is no WKT. */
export function wktMeasures(wkt: string): WktMeasures | undefined {
  if (wkt.length > LONGEST || !/^\s*\p{L}[\p{L}_]*\s*[[(]/u.test(wkt)) return undefined;
  try {
    const part = wholeSchema.parse(parse(wkt.trim()));
    const code = /^EPSG:(\d+)$/.exec(part.title ?? '')?.[1];
    const { a, rf, lat0, lat1, lat2, long0, longc, alpha, k0, x0, y0, to_meter } = part;
    return {
      name: part.name,
      code: code === undefined ? undefined : Number(code),
      projection: projectionOf(part.projName),
      datum: part.GEOGCS?.DATUM.name ?? part.DATUM?.name ?? part.datumCode ?? '',
      numbers: { a, rf, lat0, lat1, lat2, long0: long0 ?? longc, alpha, k0, x0, y0, to_meter },
    };
  } catch {
    return undefined;
  }
}
