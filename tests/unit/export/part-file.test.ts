import { describe, expect, it } from 'vitest';
import { TooLarge } from '@/lib/errors';
import { writePartFile } from '@/lib/export/part-file';
import { writeThreeMf } from '@/lib/export/three-mf';
import { boxMesh } from '@/tests/support/kernel-fixtures';

const bodies = [
  { name: 'a', mesh: boxMesh([1, 2, 3]) },
  { name: 'b', mesh: boxMesh([3, 2, 1]) },
];
const part = { title: 'Solid clip', material: 'PLA', bodies };

describe('the file of a part', () => {
  it('is a binary STL file of all bodies, its header safe whatever the title', () => {
    const bytes = writePartFile({ ...part, format: 'stl' });
    expect(bytes).toHaveLength(84 + 50 * 24);
    expect(new TextDecoder().decode(bytes.slice(0, 24))).toBe('Bendwell, mm: Solid clip');
  });

  it('is a 3MF file where that is asked for', () => {
    expect(writePartFile({ ...part, format: '3mf' })).toEqual(writeThreeMf(part));
  });

  it('is refused over the number of triangles, and over the number of bytes', () => {
    const write = (limits: { triangles: number; bytes: number }) => () =>
      writePartFile({ ...part, format: 'stl' }, limits);
    expect(write({ triangles: 24, bytes: 1284 })).not.toThrow();
    expect(write({ triangles: 23, bytes: 1284 })).toThrow(
      new TooLarge('The part has 24 triangles; a file may have at most 23'),
    );
    expect(write({ triangles: 24, bytes: 1283 })).toThrow(
      new TooLarge('The file has 1284 bytes; at most 1283 are allowed'),
    );
  });
});
