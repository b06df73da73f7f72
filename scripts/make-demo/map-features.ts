import { common, cut, holes, offset, outers } from './clip.ts';
import { collect, lineString, point, polygon } from './features.ts';
import type { Feature, Geometry } from './features.ts';
import { boundsOf } from './polygons.ts';
import { atChainage, boxFrom, boxTo, crossingLine, stationBox } from './sites.ts';
import type { Town } from './town.ts';
import { rectangle } from './vector.ts';
import type { Ring } from './vector.ts';

export function streetFeatures({ streets }: Town): Feature[] {
  return collect(
    streets.map(({ line, name, width, class: kind }) => ({
      geometry: lineString(line),
      properties: { name, width: Math.round(width * 10) / 10, class: kind },
    })),
  );
}

type Part = { geometry: Geometry; properties: { name: string; kind: string } };

function waterParts(rings: readonly Ring[], name: string, kind: string): Part[] {
  return outers(rings).map((ring) => ({ geometry: polygon(ring), properties: { name, kind } }));
}

/** The sea, the harbour, its dock and the cut, side by side without overlap. */
export function waterFeatures({ terrain: { water } }: Town): Feature[] {
  const [west, south, east, north] = boundsOf(water.coast);
  const reach = Math.max(3000, east - west);
  const everywhere = rectangle(
    [(west + east) / 2, (south + north) / 2],
    [1, 0],
    east - west + 2 * reach,
    north - south + 2 * reach,
  );
  const bank = cut([water.coast], [water.approach]);
  const sea = cut([everywhere], [...bank, water.quayLine]);
  const [shell] = outers(sea);
  const open =
    shell === undefined
      ? []
      : [{ geometry: polygon(shell, holes(sea)), properties: { name: 'North Sea', kind: 'sea' } }];
  const basin = cut([water.quayLine], [water.dock]);
  return collect([
    ...open,
    ...waterParts(basin, 'Old Harbour', 'harbour'),
    ...waterParts(common([water.dock], [water.quayLine]), 'Salt Dock', 'dock'),
    ...waterParts(cut(common(water.cutRings, bank), [water.quayLine]), 'The Cut', 'cut'),
  ]);
}

export function landFeatures({ terrain: { water } }: Town): Feature[] {
  const bank = water.land.map((ring) => ({
    geometry: polygon(ring),
    properties: { kind: 'bank' },
  }));
  const dunes = offset([...water.land], -7, 'round').map((ring) => ({
    geometry: polygon(ring),
    properties: { kind: 'upper beach' },
  }));
  return collect([...bank, ...dunes]);
}

export function quayFeatures({ terrain: { water } }: Town): Feature[] {
  const wall = water.quayLine;
  return collect([
    { geometry: lineString([...wall, ...wall.slice(0, 1)]), properties: { kind: 'quay wall' } },
    ...water.jetties.map((ring) => ({ geometry: polygon(ring), properties: { kind: 'jetty' } })),
    ...water.moles.map((ring) => ({ geometry: polygon(ring), properties: { kind: 'mole' } })),
  ]);
}

export function openFeatures({ sites }: Town): Feature[] {
  return collect(
    sites.map((site) => ({
      geometry: polygon(site.ring),
      properties: { name: site.name, kind: site.kind },
    })),
  );
}

export function gardenFeatures({ blocks }: Town): Feature[] {
  return collect(
    blocks.map(({ ring, filled }) => ({
      geometry: polygon(ring),
      properties: { style: filled.style },
    })),
  );
}

export function wallFeatures({ walls }: Town): Feature[] {
  return collect(walls.map((wall) => ({ geometry: lineString(wall), properties: {} })));
}

export function treeFeatures({ trees }: Town): Feature[] {
  return collect(trees.map(({ at, radius }) => ({ geometry: point(at), properties: { radius } })));
}

/** Where the demo's metro goes: what the town was laid out to be crossed by. */
export function crossingFeatures(): Feature[] {
  const shafts = [
    { name: 'West Quay shaft', at: atChainage(2236, 31), radius: 6 },
    { name: 'Rope Walk shaft', at: atChainage(2696, -31), radius: 5 },
  ];
  return collect([
    {
      geometry: lineString(crossingLine),
      properties: { kind: 'centre line', startChainage: 2060 },
    },
    {
      geometry: polygon(stationBox()),
      properties: {
        kind: 'station box',
        name: 'Market Place',
        fromChainage: boxFrom,
        toChainage: boxTo,
      },
    },
    ...shafts.map(({ name, at, radius }) => ({
      geometry: point(at),
      properties: { kind: 'shaft', name, radius },
    })),
  ]);
}
