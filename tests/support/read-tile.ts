type Field = { readonly number: number; readonly value: number | Buffer };

/** A feature of a vector tile, its geometry left as the tile packs it. */
export type TileFeature = {
  readonly id: number | undefined;
  readonly type: number;
  readonly properties: Readonly<Record<string, string>>;
};

/** The fields of a message in protocol buffers, of the two kinds that vector tiles use here. */
function fieldsOf(bytes: Buffer): Field[] {
  let at = 0;
  function varint(): number {
    let [value, scale] = [0, 1];
    for (;;) {
      const byte = bytes.readUInt8(at);
      at += 1;
      value += (byte & 0x7f) * scale;
      if (byte < 0x80) return value;
      scale *= 128;
    }
  }
  const fields: Field[] = [];
  while (at < bytes.length) {
    const key = varint();
    const number = Math.floor(key / 8);
    if (key % 8 === 0) fields.push({ number, value: varint() });
    else if (key % 8 === 2) {
      const length = varint();
      fields.push({ number, value: bytes.subarray(at, at + length) });
      at += length;
    } else throw new Error(`A tile has no fields of kind ${key % 8} here.`);
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
    const tags = [...(buffers(fields, 2)[0] ?? [])];
    const pairs = tags.flatMap((tag, k) =>
      k % 2 === 0 ? [[keys[tag] ?? '', values[tags[k + 1] ?? -1] ?? ''] as const] : [],
    );
    const [id, type] = [numeral(fields, 1), numeral(fields, 3) ?? 0];
    return { id, type, properties: Object.fromEntries(pairs) };
  });
  return [String(buffers(layer, 1)[0]), features];
}

/** The layers of a small vector tile (fewer than 128 different values), written apart from what makes them. */
export function readTile(bytes: unknown): Readonly<Record<string, TileFeature[]>> {
  if (!Buffer.isBuffer(bytes)) throw new Error('A tile is bytes.');
  return Object.fromEntries(buffers(fieldsOf(bytes), 3).map(layerOf));
}
