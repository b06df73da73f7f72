import type { Basemap, LonLatBounds } from '../../../shared/schemas/basemap.ts';
import type { ExtentAnswer } from '../../../shared/schemas/buildings.ts';
import type { SchemeAnswer } from '../../../shared/schemas/schemes.ts';
import { BACKGROUND_ZOOMS, BUILDING_ZOOMS } from '../../../shared/schemas/tiles.ts';
import type { MapPlan, TileSet } from '../map/map-plan.ts';

export type PlanSources = {
  readonly scheme: Pick<SchemeAnswer, 'id' | 'registerVersion' | 'backgroundVersion'>;
  readonly extent: ExtentAnswer;
  /** The demo's own map, where there is one. */
  readonly basemap: Basemap | undefined;
  /** Whether streets, water, rail or parks were uploaded. */
  readonly hasBackground: boolean;
  /** Where the application is served from: the map fetches tiles by whole addresses. */
  readonly origin: string;
};

function holds(outer: LonLatBounds, [west, south, east, north]: LonLatBounds): boolean {
  return outer[0] <= west && outer[1] <= south && outer[2] >= east && outer[3] >= north;
}

/** The demo's map belongs under a scheme whose buildings stand on it and under no other. */
function basemapTiles({ basemap, extent, origin }: PlanSources): TileSet | null {
  const [path] = basemap?.tiles ?? [];
  if (basemap === undefined || path === undefined) return null;
  if (extent.from !== 'buildings' || !holds(basemap.bounds, extent.bounds)) return null;
  const { bounds, minzoom, maxzoom } = basemap;
  return { url: `${origin}${path}`, bounds, minzoom, maxzoom };
}

function schemeTiles(
  { scheme, origin }: PlanSources,
  kind: 'buildings' | 'background',
  bounds: LonLatBounds | null,
): TileSet {
  const [version, zooms] =
    kind === 'buildings'
      ? [scheme.registerVersion, BUILDING_ZOOMS]
      : [scheme.backgroundVersion, BACKGROUND_ZOOMS];
  return {
    url: `${origin}/api/schemes/${scheme.id}/tiles/${kind}/${version}/{z}/{x}/{y}.pbf`,
    bounds,
    minzoom: zooms.least,
    maxzoom: zooms.most,
  };
}

/** What the map shows of a scheme as it stands. */
export function planOfScheme(sources: PlanSources): MapPlan {
  const { extent, scheme } = sources;
  const basemap = basemapTiles(sources);
  // the demo's ground came with it and is under its map already; what somebody brought in lies over it
  const isBroughtIn = basemap === null || scheme.backgroundVersion > 0;
  const hasBackground = sources.hasBackground && isBroughtIn;
  const [, south, , north] = extent.bounds;
  return {
    latitude: (south + north) / 2,
    basemap,
    background: hasBackground ? schemeTiles(sources, 'background', null) : null,
    buildings:
      extent.from === 'buildings' ? schemeTiles(sources, 'buildings', extent.bounds) : null,
  };
}
