import type { TwinRow } from './twin-town.ts';

type Vertex = readonly [number, number, number];
type Put = (point: readonly [number, number], z: number) => number;
type Objects = Record<string, object>;
type Options = {
  readonly crs: string;
  readonly version?: string;
  /** Without it nothing says which face is which. */
  readonly semantics?: boolean;
  /** A feature with vertices of its own on each line. */
  readonly lines?: boolean;
};

const TALL = 6;

/** Whole numbers of vertices are thousandths about here; degrees are finer. */
function transformOf(rows: readonly TwinRow[]) {
  const isDegrees = Math.abs(rows[0]?.parts[0]?.[0]?.[0]?.[0] ?? 0) < 180;
  const scale = isDegrees ? 1e-9 : 0.001;
  const translate = isDegrees ? [-5, 40, 0] : [352_000, 4_436_800, 0];
  return { scale: [scale, scale, 0.001] as const, translate };
}

function putter(rows: readonly TwinRow[], vertices: Vertex[]): Put {
  const { scale, translate } = transformOf(rows);
  const [tx = 0, ty = 0] = translate;
  return ([x, y], z) => {
    const [dx, dy] = [Math.round((x - tx) / scale[0]), Math.round((y - ty) / scale[1])];
    return vertices.push([dx, dy, Math.round(z / scale[2])]) - 1;
  };
}

/** A part as a block with ground, walls and roof. */
function blockOf(
  part: TwinRow['parts'][number],
  height: number,
  put: Put,
  semantics: boolean,
): object {
  const level = (z: number, isUp: boolean) =>
    part.map((ring) => {
      const open = ring.slice(0, -1).map((point) => put(point, z));
      return isUp ? open : open.reverse();
    });
  const walls = part.flatMap((ring) =>
    ring.slice(0, -1).map((from, k) => {
      const to = ring[k + 1] ?? from;
      const [low, high] = [height, height + TALL];
      return [[put(from, low), put(to, low), put(to, high), put(from, high)]];
    }),
  );
  const shell = [level(height + TALL, true), ...walls, level(height, false)];
  const said = {
    surfaces: [{ type: 'RoofSurface' }, { type: 'WallSurface' }, { type: 'GroundSurface' }],
    values: [[0, ...walls.map(() => 1), 2]],
  };
  return {
    type: 'Solid',
    lod: '2.2',
    boundaries: [shell],
    ...(semantics ? { semantics: said } : {}),
  };
}

/** A building; every other keeps its blocks in parts. */
function objectsOf(row: TwinRow, index: number, put: Put, semantics: boolean): Objects {
  const [id, { attributes, height }] = [`B${index}`, row];
  const blocks = row.parts.map((part) => blockOf(part, height, put, semantics));
  if (index % 2 === 0) return { [id]: { type: 'Building', attributes, geometry: blocks } };
  const parts = blocks.map((block, k): [string, object] => {
    return [`${id}-${k}`, { type: 'BuildingPart', parents: [id], geometry: [block] }];
  });
  const children = parts.map(([name]) => name);
  return { [id]: { type: 'Building', attributes, children }, ...Object.fromEntries(parts) };
}

/** A CityJSON file of buildings as blocks. */
export function cityjsonFile(rows: readonly TwinRow[], options: Options): Buffer {
  const { crs, version = '2.0', semantics = true, lines = false } = options;
  const metadata = { referenceSystem: crs };
  const heading = { type: 'CityJSON', version, metadata, transform: transformOf(rows) };
  if (!lines) {
    const vertices: Vertex[] = [];
    const put = putter(rows, vertices);
    const all = rows.map((row, index) => objectsOf(row, index, put, semantics));
    const whole = { ...heading, CityObjects: Object.assign({}, ...all) as Objects, vertices };
    return Buffer.from(JSON.stringify(whole));
  }
  const features = rows.map((row, index) => {
    const vertices: Vertex[] = [];
    const objects = objectsOf(row, index, putter(rows, vertices), semantics);
    return { type: 'CityJSONFeature', id: `B${index}`, CityObjects: objects, vertices };
  });
  const first = { ...heading, CityObjects: {}, vertices: [] };
  return Buffer.from([first, ...features].map((line) => JSON.stringify(line)).join('\n'));
}
