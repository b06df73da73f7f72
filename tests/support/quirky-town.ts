/** Where the town stands: off any coast, in UTM zone 31. */
const WEST = 1.644;
const SOUTH = 54.757;
/** About fifteen metres. */
const SIDE = 0.00018;

type Corner = readonly number[];

type Building = {
  readonly type: 'Feature';
  readonly properties: Readonly<Record<string, string | number | null>>;
  readonly geometry: { readonly type: string; readonly coordinates: unknown } | null;
};

export type QuirkyTown = {
  readonly type: 'FeatureCollection';
  readonly features: readonly Building[];
};

function cornerOf(index: number): [number, number] {
  return [WEST + (index % 5) * 2 * SIDE, SOUTH + Math.floor(index / 5) * 2 * SIDE];
}

function square(index: number, side = SIDE, height?: number): Corner[] {
  const [x, y] = cornerOf(index);
  const ring = [[x, y], [x + side, y], [x + side, y + side * 0.6], [x, y + side * 0.6], [x, y]]; // prettier-ignore
  return height === undefined ? ring : ring.map((corner) => [...corner, height]);
}

function crossing(index: number): Corner[] {
  const [a = [], b = [], c = [], d = []] = square(index);
  return [a, c, b, d, a];
}

function building(
  index: number,
  geometry: Building['geometry'] = { type: 'Polygon', coordinates: [square(index)] },
  properties: Building['properties'] = {},
): Building {
  const known = { ref: `Q-${index}`, house: `House ${index}`, floors: '2', eaves: '6,5' };
  return { type: 'Feature', properties: { ...known, ...properties }, geometry };
}

/**
 * A made-up town with the quirks of real ones: figures as text with decimal commas, blanks, heights on
 * corners, parts and holes, an outline that crosses itself, one that is twice there and one without ground.
 */
export function quirkyTown(): QuirkyTown {
  const [x, y] = cornerOf(3);
  const hole = [[x, y], [x + SIDE / 4, y], [x + SIDE / 4, y + SIDE / 4], [x, y]].map(
    ([east = 0, north = 0]) => [east + SIDE / 4, north + SIDE / 8],
  ); // prettier-ignore
  return {
    type: 'FeatureCollection',
    features: [
      building(1),
      building(2, { type: 'Polygon', coordinates: [square(2, SIDE, 12.5)] }, { floors: '' }),
      building(3, { type: 'Polygon', coordinates: [square(3), hole] }),
      building(4, { type: 'MultiPolygon', coordinates: [[square(4)], [square(9)]] }),
      building(5, { type: 'Polygon', coordinates: [crossing(5)] }),
      building(6, undefined, { floors: 'many', eaves: '7,25' }),
      building(7, undefined, { ref: 'Q-1' }),
      building(8, null),
      building(10),
      building(11),
    ],
  };
}

/** The town as a later survey has it: some buildings with other values. */
export function laterTown(changes: Readonly<Record<string, Building['properties']>>): QuirkyTown {
  const { type, features } = quirkyTown();
  return {
    type,
    features: features.map((one) => {
      const change = changes[String(one.properties.ref)];
      return change === undefined ? one : { ...one, properties: { ...one.properties, ...change } };
    }),
  };
}
