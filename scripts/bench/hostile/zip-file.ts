import { crc32, deflateRawSync } from 'node:zlib';

export type ZipFile = {
  readonly name: string;
  readonly content: Buffer | string;
  /** What the archive says of the file, where that is not true. */
  readonly claims?: {
    readonly unpacked?: number;
    readonly flags?: number;
    readonly method?: number;
  };
};

function heading(
  { name, content, claims = {} }: ZipFile,
  packed: Buffer,
): { own: Buffer; listed: Buffer } {
  const bytes = Buffer.from(content);
  const common = Buffer.alloc(26);
  common.writeUInt16LE(20, 0);
  common.writeUInt16LE(claims.flags ?? 0, 2);
  common.writeUInt16LE(claims.method ?? 8, 4);
  common.writeUInt32LE(crc32(bytes), 10);
  common.writeUInt32LE(packed.length, 14);
  common.writeUInt32LE(claims.unpacked ?? bytes.length, 18);
  common.writeUInt16LE(Buffer.byteLength(name), 22);
  const [ownMark, listedMark] = [
    Buffer.from('PK\x03\x04'),
    Buffer.from('PK\x01\x02\x14\0', 'latin1'),
  ];
  return {
    own: Buffer.concat([ownMark, common, Buffer.from(name)]),
    listed: Buffer.concat([listedMark, common, Buffer.alloc(14), Buffer.from(name)]),
  };
}

/** An archive of some files, as zip programs write them. */
export function zipFile(files: readonly ZipFile[]): Buffer {
  const [parts, list]: [Buffer[], Buffer[]] = [[], []];
  let at = 0;
  for (const file of files) {
    const packed = deflateRawSync(file.content);
    const { own, listed } = heading(file, packed);
    listed.writeUInt32LE(at, 42);
    list.push(listed);
    parts.push(own, packed);
    at += own.length + packed.length;
  }
  const end = Buffer.alloc(22);
  end.write('PK\x05\x06', 'latin1');
  // more are told elsewhere, by the book
  end.writeUInt16LE(Math.min(files.length, 0xffff), 8);
  end.writeUInt16LE(Math.min(files.length, 0xffff), 10);
  end.writeUInt32LE(Buffer.concat(list).length, 12);
  end.writeUInt32LE(at, 16);
  return Buffer.concat([...parts, ...list, end]);
}
