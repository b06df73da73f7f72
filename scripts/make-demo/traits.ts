import type { Footprint } from './footprints.ts';
import { innName, storeName } from './names.ts';
import { signedArea } from './polygons.ts';
import type { Random } from './prng.ts';
import { gradeByName, traitsByKind } from './traits-by-kind.ts';
import type { Condition, Construction, Foundation, KindTraits, Listing } from './traits-by-kind.ts';

type Traits = {
  readonly name: string | null;
  readonly use: string;
  readonly storeys: number;
  readonly eavesHeight: number;
  readonly foundingLevel: number | null;
  readonly foundation: Foundation;
  readonly construction: Construction;
  readonly listed: Listing;
  readonly condition: Condition;
};

function tenths(value: number): number {
  return Math.round(value * 10) / 10;
}

function nameOf(footprint: Footprint, random: Random): string | null {
  if (footprint.name !== null) return footprint.name;
  if (footprint.kind === 'public house') return innName(random);
  return footprint.kind === 'warehouse' && random.chance(0.3) ? storeName(random) : null;
}

function listingOf(
  footprint: Footprint,
  kind: KindTraits,
  isOld: boolean,
  random: Random,
): Listing {
  const known = footprint.name === null ? undefined : gradeByName.get(footprint.name);
  if (known !== undefined) return known;
  const share = isOld ? kind.listed[0] : kind.listed[1];
  return random.chance(share)
    ? random.weighted<Listing>([
        ['listed, special', 0.3],
        ['listed, local', 0.7],
      ])
    : 'not listed';
}

function foundationOf(kind: KindTraits, storeys: number, random: Random): Foundation {
  if (random.chance(kind.founded === 'piled' ? 0.2 : 0.42)) return 'unknown';
  if (kind.built === 'framed' && storeys < 4) return 'raft';
  return kind.founded;
}

const depths: Record<Foundation, readonly [number, number]> = {
  strip: [0.7, 1.6],
  raft: [0.4, 0.9],
  piled: [9, 17],
  unknown: [1, 1],
};

/** Most founding levels are not known; a few were seen in trial pits or on old drawings. */
function foundingOf(
  foundation: Foundation,
  ground: number,
  isOld: boolean,
  random: Random,
): number | null {
  if (foundation === 'unknown' || !random.chance(foundation === 'piled' ? 0.4 : 0.1)) return null;
  const cellar = isOld && foundation === 'strip' && random.chance(0.35) ? 1.7 : 0;
  return tenths(ground - cellar - random.range(...depths[foundation]));
}

function conditionOf(isOld: boolean, random: Random): Condition {
  return isOld
    ? random.weighted<Condition>([
        ['good', 0.2],
        ['fair', 0.38],
        ['poor', 0.12],
        ['unknown', 0.3],
      ])
    : random.weighted<Condition>([
        ['good', 0.34],
        ['fair', 0.28],
        ['poor', 0.04],
        ['unknown', 0.34],
      ]);
}

/** Storeys follow the row where a row was built together, and the house where it was not. */
function storeysOf(footprint: Footprint, kind: KindTraits, row: Random, own: Random): number {
  const isUniform = footprint.row.startsWith('terrace') || footprint.row.startsWith('villas');
  const drawn = (isUniform ? row : own).whole(...kind.storeys);
  return signedArea(footprint.ring) < 60 && drawn > 3 ? 3 : drawn;
}

/** Some shops and blocks of flats were put up as frames behind a brick front. */
function constructionOf(kind: KindTraits, random: Random): Construction {
  if (kind.built !== 'masonry') return kind.built;
  const framed = kind.use.startsWith('shop') || kind.use === 'dwellings' ? 0.12 : 0.01;
  return random.weighted<Construction>([
    ['masonry', 0.97 - framed],
    ['framed', framed],
    ['unknown', 0.03],
  ]);
}

/** Makes up what a survey of the building from the street would say. */
export function drawTraits(
  footprint: Footprint,
  ground: number,
  isOld: boolean,
  row: Random,
  own: Random,
): Traits {
  const kind = traitsByKind[footprint.kind];
  const storeys = storeysOf(footprint, kind, row.fork('storeys'), own);
  const foundation = foundationOf(kind, storeys, own);
  const plinth = storeys > 1 ? own.range(0, 0.5) : 0;
  return {
    name: nameOf(footprint, own),
    use: kind.use,
    storeys,
    eavesHeight: tenths(storeys * kind.storeyHeight + plinth),
    foundingLevel: foundingOf(foundation, ground, isOld, own),
    foundation,
    construction: constructionOf(kind, own),
    listed: listingOf(footprint, kind, isOld, own),
    condition: conditionOf(isOld, own),
  };
}
