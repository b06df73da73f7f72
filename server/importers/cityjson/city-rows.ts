import { IMPORT_LIMITS } from '../../../shared/schemas/imports.ts';
import { flatProperties } from '../flat-properties.ts';
import { dissolveFaces } from '../geometry/dissolve-faces.ts';
import { RowFault } from '../geometry/row-fault.ts';
import type { SourceRow } from '../source.ts';
import { readGeometry, type CityObject, type Face, type Geometry } from './city-objects.ts';
import { groundFaces } from './ground-faces.ts';
import type { Vertices } from './vertices.ts';

/** Finds another object of the same file. */
export type FindObject = (id: string) => CityObject | undefined;

const MOST_PARTS = 1000;

function geometriesOf({ geometry = [] }: CityObject): Geometry[] {
  return geometry.map(readGeometry).filter((one) => one !== undefined);
}

function partsOf({ children = [] }: CityObject, find: FindObject): CityObject[] {
  return children
    .slice(0, MOST_PARTS)
    .map(find)
    .filter((one) => one?.type === 'BuildingPart')
    .filter((one) => one !== undefined);
}

function facesOf(object: CityObject, find: FindObject, vertices: Vertices): readonly Face[] {
  const own = geometriesOf(object);
  const flat = own.filter(({ lod, isFlat }) => isFlat && lod < 1);
  if (flat.length > 0) return groundFaces(flat, vertices);
  const ofParts = partsOf(object, find).flatMap((part) =>
    groundFaces(geometriesOf(part), vertices),
  );
  return ofParts.length > 0 ? ofParts : groundFaces(own, vertices);
}

function footprintOf(object: CityObject, find: FindObject, vertices: Vertices): unknown {
  const faces = facesOf(object, find, vertices);
  if (faces.length === 0) throw new RowFault('It has no face on the ground.');
  const corners = faces.flat().reduce((sum, { length }) => sum + length, 0);
  if (corners > IMPORT_LIMITS.corners * 10) throw new RowFault('It has more than 10,000 corners.');
  const rings = faces.map((face) =>
    face.map((ring) =>
      ring.map((index) => {
        const [x, y] = vertices(index);
        return [x, y] as const;
      }),
    ),
  );
  return { type: 'MultiPolygon', coordinates: dissolveFaces(rings) };
}

/** Buildings, and parts that belong to none; parts of a building become parts of its footprint. */
export function isOneRow({ type, parents = [] }: CityObject): boolean {
  return type === 'Building' || (type === 'BuildingPart' && parents.length === 0);
}

/** The row of a building: its attributes, its name in the file as "id", and its faces on the ground. */
export function cityRow(
  row: number,
  id: string,
  object: CityObject,
  { find, vertices }: { readonly find: FindObject; readonly vertices: Vertices },
): SourceRow {
  const properties = flatProperties(object.attributes, { id });
  try {
    return { row, geometry: footprintOf(object, find, vertices), fault: null, properties };
  } catch (error) {
    if (!(error instanceof RowFault)) throw error;
    return { row, geometry: null, fault: error.message, properties };
  }
}
