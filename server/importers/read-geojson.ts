import { z } from 'zod';
import { jsonFault } from '../../shared/schemas/json-fault.ts';
import { findCrs } from '../crs/find-crs.ts';
import { toLonLat } from '../crs/to-lon-lat.ts';
import { AppError } from '../errors.ts';
import { checkJson } from './check-json.ts';
import type { Drawing } from './drawing.ts';

const collectionSchema = z.object({
  type: z.literal('FeatureCollection'),
  crs: z.object({ properties: z.object({ name: z.string().max(200) }) }).nullish(),
  features: z.array(z.unknown()),
});

/** In degrees, and alike to a metre. */
const DEGREES = [4326, 4258];

function parse(bytes: Buffer): unknown {
  checkJson(bytes);
  let text: string;
  try {
    text = new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    throw new AppError('unreadable', 'The file is neither a zipped Shapefile nor text in UTF-8.');
  }
  try {
    return JSON.parse(text);
  } catch {
    throw new AppError('unreadable', `The file is not JSON. ${jsonFault(text)}`);
  }
}

async function placeOf(crs: string | undefined): Promise<Drawing['place']> {
  if (crs === undefined || /\bCRS84$/i.test(crs)) return (point) => point;
  const code = Number(/\bEPSG:(?:[\d.]*:)?(\d{4,5})$/i.exec(crs)?.[1]);
  if (DEGREES.includes(code)) return (point) => point;
  const system = Number.isNaN(code) ? undefined : await findCrs(code);
  if (system === undefined) {
    throw new AppError('unreadable', `The grid "${crs}" is not known here.`);
  }
  if ('fault' in system) throw new AppError('unreadable', system.fault);
  return toLonLat(system.crs.definition);
}

function member(value: unknown, key: string): unknown {
  if (typeof value !== 'object' || value === null) return undefined;
  return Object.entries(value).find(([name]) => name.toLowerCase() === key)?.[1];
}

/** Reads GeoJSON: in longitude and latitude, or in the grid that its `crs` names. */
export async function readGeojson(bytes: Buffer): Promise<Drawing> {
  const collection = collectionSchema.safeParse(parse(bytes));
  if (!collection.success) {
    throw new AppError('unreadable', 'The file is not a FeatureCollection of GeoJSON.');
  }
  const { crs, features } = collection.data;
  return {
    place: await placeOf(crs?.properties.name),
    features: features.map((feature) => ({
      geometry: member(feature, 'geometry'),
      name: member(member(feature, 'properties'), 'name'),
    })),
  };
}
