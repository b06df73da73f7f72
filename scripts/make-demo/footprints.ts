import type { Point, Ring } from './vector.ts';

export type Kind =
  | 'terraced house'
  | 'shop'
  | 'public house'
  | 'town house'
  | 'warehouse'
  | 'workshop'
  | 'outbuilding'
  | 'semi-detached house'
  | 'detached house'
  | 'flats'
  | 'office'
  | 'courtyard block'
  | 'church'
  | 'chapel'
  | 'customs house'
  | 'bridge keeper’s house'
  | 'school'
  | 'town hall'
  | 'market hall'
  | 'ropewalk'
  | 'fish market'
  | 'almshouses'
  | 'lifeboat house'
  | 'net loft'
  | 'garage';

/** A building on the ground, before anything is known of it but its shape. */
export type Footprint = {
  readonly ring: Ring;
  readonly holes: readonly Ring[];
  readonly kind: Kind;
  readonly name: string | null;
  /** A point on the street front, from which the address is read. */
  readonly front: Point;
  /** The house an outbuilding belongs to. */
  readonly behind: Footprint | null;
  /** Buildings of one row were built together and are alike. */
  readonly row: string;
  readonly corner: boolean;
};

export function footprint(
  ring: Ring,
  kind: Kind,
  front: Point,
  rest: Partial<Footprint> = {},
): Footprint {
  return {
    ring,
    holes: [],
    kind,
    name: null,
    front,
    behind: null,
    row: '',
    corner: false,
    ...rest,
  };
}
