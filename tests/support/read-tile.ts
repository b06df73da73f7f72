type Field = { readonly number: number; readonly value: number | Buffer };

/** A feature of a vector tile, its geometry left as the tile packs it. */
export type TileFeature = {
  readonly id: number | undefined;
  readonly type: number;
  readonly properties: Readonly<Record<string, string>>;
};

/** The number that stands packed at a place, and the place after it. */
function varintAt(bytes: Buffer, start: number): [value: number, next: number] {
  let [value, scale, at] = [0, 1, start];
  for (;;) {
    const byte = bytes.readUInt8(at);
    at += 1;
    value += (byte & 0x7f) * scale;
    if (byte < 0x80) return [value, at];
    scale *= 128;
  }
}

function varintsOf(bytes: Buffer): number[] {
  const values: number[] = [];
  let at = 0;
  while (at < bytes.length) {
    const [value, next] = varintAt(bytes, at);
    values.push(value);
    at = next;
  }
  return values;
}

/** The fields of a message in protocol buffers, of the three kinds that vector tiles use here. */
function fieldsOf(bytes: Buffer): Field[] {
  const fields: Field[] = [];
  let at = 0;
  while (at < bytes.length) {
    const [key, start] = varintAt(bytes, at);
    const number = Math.floor(key / 8);
    if (key % 8 === 1) {
      fields.push({ number, value: bytes.readDoubleLE(start) });
      at = start + 8;
      continue;
    }
    const [value, next] = varintAt(bytes, start);
    if (key % 8 === 0) fields.push({ number, value });
    else if (key % 8 === 2) fields.push({ number, value: bytes.subarray(next, next + value) });
    else throw new Error(`A tile has no fields of kind ${key % 8} here.`);
    at = key % 8 === 2 ? next + value : next;
  }
  return fields;
}

function buffers(fields: readonly Field[], wanted: number): Buffer[] {
  return fields.flatMap(({ number, value }) =>
    number === wanted && Buffer.isBuffer(value) ? [value] : [],
  );
}

function numeral(fields: readonly Field[], wanted: number): number | undefined {
  const found = fields.find(({ number }) => number === wanted)?.value;
  return typeof found === 'number' ? found : undefined;
}

function layerOf(bytes: Buffer): [string, TileFeature[]] {
  const layer = fieldsOf(bytes);
  const keys = buffers(layer, 3).map(String);
  const values = buffers(layer, 4).map((value) => String(buffers(fieldsOf(value), 1)[0]));
  const features = buffers(layer, 2).map((feature) => {
    const fields = fieldsOf(feature);
    const tags = varintsOf(buffers(fields, 2)[0] ?? Buffer.alloc(0));
    const pairs = tags.flatMap((tag, k) =>
      k % 2 === 0 ? [[keys[tag] ?? '', values[tags[k + 1] ?? -1] ?? ''] as const] : [],
    );
    const [id, type] = [numeral(fields, 1), numeral(fields, 3) ?? 0];
    return { id, type, properties: Object.fromEntries(pairs) };
  });
  return [String(buffers(layer, 1)[0]), features];
}

/** The layers of a vector tile, read apart from what makes them; only texts are read of properties. */
export function readTile(bytes: unknown): Readonly<Record<string, TileFeature[]>> {
  if (!Buffer.isBuffer(bytes)) throw new Error('A tile is bytes.');
  return Object.fromEntries(buffers(fieldsOf(bytes), 3).map(layerOf));
}
