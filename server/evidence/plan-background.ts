import type { Position } from 'geojson';
import type { PlanBackground } from '../../shared/evidence/plan-material.ts';
import type { PlanPoint } from '../../shared/geometry/point.ts';
import type { DrawnBackground } from '../models/find-background-in-box.ts';

type ToGrid = (point: PlanPoint) => PlanPoint;

function linesOf({ geometry }: DrawnBackground): readonly Position[][] {
  if (geometry.type === 'LineString') return [geometry.coordinates];
  if (geometry.type === 'MultiPolygon') return geometry.coordinates.flat();
  const isList = geometry.type === 'MultiLineString' || geometry.type === 'Polygon';
  return isList ? geometry.coordinates : [];
}

/** A feature of a background in a grid; where the grid does not reach, without its lines. */
export function planBackground(drawn: DrawnBackground, toGrid: ToGrid): PlanBackground {
  const lines = linesOf(drawn).map((line) =>
    line.map(([longitude = NaN, latitude = NaN]) => toGrid([longitude, latitude])),
  );
  return {
    layer: drawn.layer,
    name: drawn.name,
    isArea: drawn.geometry.type.endsWith('Polygon'),
    lines: lines.filter((line) => line.flat().every(Number.isFinite)),
  };
}
