import { createRequire } from 'node:module';

interface StlSerializer {
  serialize(options: { binary: boolean }, ...objects: unknown[]): ArrayBuffer[];
}

/** @jscad/stl-serializer, which ships no types, with its pieces joined to one file. */
export function serialize(options: { binary: true }, object: unknown): Uint8Array<ArrayBuffer> {
  const { serialize: pieces } = createRequire(import.meta.url)('@jscad/stl-serializer') as StlSerializer;
  const parts = pieces(options, object).map((part) => new Uint8Array(part));
  const bytes = new Uint8Array(parts.reduce((sum, part) => sum + part.length, 0));
  parts.reduce((offset, part) => {
    bytes.set(part, offset);
    return offset + part.length;
  }, 0);
  return bytes;
}
