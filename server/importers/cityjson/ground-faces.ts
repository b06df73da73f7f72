import { readFace, type Face, type Geometry } from './city-objects.ts';
import type { Vertices } from './vertices.ts';

type Point3 = readonly [number, number, number];

/** How upright the normal of a level face stands at least, and how near to the lowest it lies, in metres. */
const LEVEL = 0.98;
const LOWEST = 0.1;

/** The normal of a ring by Newell's sums; its length is twice the area. */
function normalOf(points: readonly Point3[]): Point3 {
  let [nx, ny, nz] = [0, 0, 0];
  const [first] = points;
  let before = points.at(-1);
  if (first === undefined || before === undefined) return [0, 0, 0];
  for (const point of points) {
    // from the first vertex, so that digits are kept far from the origin
    const [x0, y0, z0] = [before[0] - first[0], before[1] - first[1], before[2] - first[2]];
    const [x1, y1, z1] = [point[0] - first[0], point[1] - first[1], point[2] - first[2]];
    nx += (y0 - y1) * (z0 + z1);
    ny += (z0 - z1) * (x0 + x1);
    nz += (x0 - x1) * (y0 + y1);
    before = point;
  }
  return [nx, ny, nz];
}

function isLevel(points: readonly Point3[]): boolean {
  const [nx, ny, nz] = normalOf(points);
  const length = Math.hypot(nx, ny, nz);
  return length > 0 && Math.abs(nz) / length > LEVEL;
}

/** The level faces that lie lowest, for what says nothing of its faces. */
function lowestFaces(faces: readonly Face[], vertices: Vertices): Face[] {
  const level = faces.flatMap((face) => {
    const points = (face[0] ?? []).map(vertices);
    if (!isLevel(points)) return [];
    return [{ face, z: points.reduce((sum, [, , z]) => sum + z, 0) / points.length }];
  });
  const lowest = Math.min(...level.map(({ z }) => z));
  return level.filter(({ z }) => z <= lowest + LOWEST).map(({ face }) => face);
}

function facesSaidGround(geometries: readonly Geometry[]): Face[] {
  return geometries.flatMap(({ faces }) =>
    faces.filter(({ is }) => is === 'GroundSurface').map(({ face }) => readFace(face)),
  );
}

function allFaces({ faces }: Geometry): Face[] {
  return faces.map(({ face }) => readFace(face));
}

/** The faces on the ground of one object: of the finest level of detail that tells. */
export function groundFaces(geometries: readonly Geometry[], vertices: Vertices): readonly Face[] {
  const lods = [...new Set(geometries.map(({ lod }) => lod))].sort((a, b) => b - a);
  const levels = lods.map((lod) => geometries.filter((one) => one.lod === lod));
  const said = levels.map(facesSaidGround).find((faces) => faces.length > 0);
  if (said !== undefined) return said;
  const flat = geometries.filter(({ lod, isFlat }) => isFlat && lod < 1);
  if (flat.length > 0) return flat.flatMap(allFaces);
  return (levels[0] ?? []).flatMap((geometry) => lowestFaces(allFaces(geometry), vertices));
}
