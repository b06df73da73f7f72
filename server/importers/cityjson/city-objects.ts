import { z } from 'zod';
import { RowFault } from '../geometry/row-fault.ts';

/** A face of a city object: its outer ring and holes, by the numbers of their vertices. */
export type Face = readonly (readonly number[])[];

const semanticsSchema = z.object({
  surfaces: z.array(z.object({ type: z.string() })),
  values: z.unknown().optional(),
});

/** In how many lists the faces of each kind of geometry lie. */
const DEPTHS = {
  MultiSurface: 0,
  CompositeSurface: 0,
  Solid: 1,
  MultiSolid: 2,
  CompositeSolid: 2,
} as const;

const geometrySchema = z.object({
  type: z.enum(['MultiSurface', 'CompositeSurface', 'Solid', 'MultiSolid', 'CompositeSolid']),
  lod: z.union([z.string(), z.number()]).transform(Number).catch(1),
  semantics: semanticsSchema.optional().catch(undefined),
  // of a model's many faces few are asked for, and only those are looked into
  boundaries: z.unknown(),
});

/** A geometry with its faces in one list, and what each face is said to be. */
export type Geometry = {
  readonly lod: number;
  readonly faces: readonly { readonly face: unknown; readonly is: string | undefined }[];
  readonly isFlat: boolean;
};

const objectSchema = z.object({
  type: z.string(),
  attributes: z.unknown().optional(),
  geometry: z.array(z.unknown()).optional().catch(undefined),
  parents: z.array(z.string()).optional().catch(undefined),
  children: z.array(z.string()).optional().catch(undefined),
});

export type CityObject = z.infer<typeof objectSchema>;

/** An object as far as it can be read; undefined where it is none. */
export function readCityObject(value: unknown): CityObject | undefined {
  return objectSchema.safeParse(value).data;
}

/** What faces are said to be, told face by face in as many brackets as the faces stand in. */
function flatValues(values: unknown): unknown[] {
  return Array.isArray(values) ? values.flat(2) : [];
}

function isIndex(value: unknown): value is number {
  return Number.isInteger(value) && Number(value) >= 0;
}

/** A face as lists of vertices, or a RowFault. */
export function readFace(value: unknown): Face {
  const rings: readonly unknown[] = Array.isArray(value) ? value : [undefined];
  return rings.map((ring) => {
    if (Array.isArray(ring) && ring.every(isIndex)) return ring;
    throw new RowFault('It has a face that is no list of vertices.');
  });
}

/** The faces of a geometry; undefined for points, lines, templates and what is no geometry. */
export function readGeometry(value: unknown): Geometry | undefined {
  const { data } = geometrySchema.safeParse(value);
  if (data === undefined) return undefined;
  const values = flatValues(data.semantics?.values);
  const boundaries: readonly unknown[] = Array.isArray(data.boundaries) ? data.boundaries : [];
  return {
    lod: data.lod,
    isFlat: DEPTHS[data.type] === 0,
    faces: boundaries.flat(DEPTHS[data.type]).map((face, index) => {
      const number = values[index];
      const said = typeof number === 'number' ? data.semantics?.surfaces[number]?.type : undefined;
      return { face, is: said };
    }),
  };
}
