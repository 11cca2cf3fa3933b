import { inflateRawSync } from 'node:zlib';

export interface ZipEntry {
  readonly name: string;
  readonly text: string;
  readonly method: number;
  readonly date: number;
  readonly time: number;
}

const END = 0x06054b50;
const CENTRAL = 0x02014b50;
const LOCAL = 0x04034b50;

/** Reads a zip by its central directory (APPNOTE 4.3), apart from the library that writes ours. */
export function readZip(bytes: Uint8Array): ZipEntry[] {
  const data = Buffer.from(bytes);
  const end = data.length - 22;
  if (data.readUInt32LE(end) !== END) throw new Error('no end of central directory');
  const entries: ZipEntry[] = [];
  let at = data.readUInt32LE(end + 16);
  for (let left = data.readUInt16LE(end + 10); left > 0; left -= 1) {
    if (data.readUInt32LE(at) !== CENTRAL) throw new Error('no central directory entry');
    const [nameLength, extra, comment] = [28, 30, 32].map((field) => data.readUInt16LE(at + field));
    const local = data.readUInt32LE(at + 42);
    if (data.readUInt32LE(local) !== LOCAL) throw new Error('no local header');
    const start = local + 30 + data.readUInt16LE(local + 26) + data.readUInt16LE(local + 28);
    const packed = data.subarray(start, start + data.readUInt32LE(at + 20));
    const method = data.readUInt16LE(at + 10);
    const content = method === 8 ? inflateRawSync(packed) : packed;
    if (content.length !== data.readUInt32LE(at + 24))
      throw new Error('an entry has another size than stated');
    entries.push({
      name: data.toString('utf8', at + 46, at + 46 + nameLength!),
      text: content.toString('utf8'),
      method,
      time: data.readUInt16LE(at + 12),
      date: data.readUInt16LE(at + 14),
    });
    at += 46 + nameLength! + extra! + comment!;
  }
  return entries;
}
