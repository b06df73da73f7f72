import type { Kind } from './footprints.ts';

export type Foundation = 'strip' | 'raft' | 'piled' | 'unknown';
export type Construction = 'masonry' | 'framed' | 'timber framed' | 'steel framed' | 'unknown';
export type Condition = 'good' | 'fair' | 'poor' | 'unknown';

/** What buildings of one kind tend to be like. */
export type KindTraits = {
  readonly use: string;
  readonly storeys: readonly [number, number];
  readonly storeyHeight: number;
  readonly founded: Foundation;
  readonly built: Construction;
  /** Share that is listed, in the old town and elsewhere. */
  readonly listed: readonly [number, number];
};

function traits(
  use: string,
  storeys: readonly [number, number],
  storeyHeight: number,
  founded: Foundation,
  built: Construction,
  listed: readonly [number, number] = [0, 0],
): KindTraits {
  return { use, storeys, storeyHeight, founded, built, listed };
}

export const traitsByKind: Record<Kind, KindTraits> = {
  'terraced house': traits('dwelling', [2, 3], 2.8, 'strip', 'masonry', [0.05, 0.002]),
  shop: traits('shop with dwelling over', [2, 4], 3, 'strip', 'masonry', [0.09, 0]),
  'public house': traits('public house', [2, 3], 3.1, 'strip', 'masonry', [0.16, 0.01]),
  'town house': traits('dwelling', [3, 4], 3.1, 'strip', 'masonry', [0.22, 0.02]),
  warehouse: traits('storage', [2, 5], 3.3, 'strip', 'masonry', [0.08, 0.03]),
  workshop: traits('workshop', [1, 2], 3.6, 'strip', 'masonry'),
  outbuilding: traits('store', [1, 1], 2.4, 'strip', 'masonry'),
  'semi-detached house': traits('dwelling', [2, 2], 2.7, 'strip', 'masonry'),
  'detached house': traits('dwelling', [1, 3], 2.8, 'strip', 'masonry', [0, 0.01]),
  flats: traits('dwellings', [5, 11], 2.8, 'piled', 'framed'),
  office: traits('offices', [3, 8], 3.6, 'piled', 'framed'),
  'courtyard block': traits('dwellings', [4, 5], 3, 'strip', 'masonry', [0.05, 0]),
  church: traits('place of worship', [1, 1], 10.8, 'strip', 'masonry', [1, 1]),
  chapel: traits('place of worship', [1, 1], 7, 'strip', 'masonry', [0.5, 0.5]),
  'customs house': traits('offices', [3, 3], 4, 'strip', 'masonry', [1, 1]),
  'bridge keeper’s house': traits('dwelling', [2, 2], 3, 'strip', 'masonry', [1, 1]),
  school: traits('school', [2, 2], 4.1, 'strip', 'masonry'),
  'town hall': traits('civic', [3, 3], 4.2, 'strip', 'masonry', [1, 1]),
  'market hall': traits('market', [1, 1], 8.5, 'strip', 'steel framed', [1, 1]),
  ropewalk: traits('workshop', [1, 1], 4.2, 'strip', 'timber framed', [1, 1]),
  'fish market': traits('market', [1, 1], 6.5, 'raft', 'steel framed'),
  almshouses: traits('dwellings', [1, 1], 3.4, 'strip', 'masonry', [1, 1]),
  'lifeboat house': traits('lifeboat station', [1, 1], 6.2, 'raft', 'framed'),
  'net loft': traits('storage', [1, 2], 2.9, 'strip', 'timber framed', [0.1, 0.1]),
  garage: traits('garage', [1, 1], 2.4, 'raft', 'masonry'),
};

export type Listing = 'listed, outstanding' | 'listed, special' | 'listed, local' | 'not listed';

/** Landmarks whose grade is known. */
export const gradeByName: ReadonlyMap<string, Listing> = new Map([
  ['Church of St Elwin', 'listed, outstanding'],
  ['Customs House', 'listed, outstanding'],
  ['Town Hall', 'listed, special'],
  ['Mariners’ Almshouses', 'listed, special'],
]);
