import { describe, expect, it } from 'vitest';
import { volumeOf } from '@/components/studio/view/volume';

const body = (volume: number) => ({ name: 'arm', triangles: 12, volume, size: [1, 1, 1] as const });

describe('the volume of the part', () => {
  it('is not known until the first solid is made', () => {
    expect(volumeOf({ status: 'loading' })).toBeNull();
    expect(volumeOf({ status: 'loading', bodies: [] })).toBeNull();
  });

  it('is that of all bodies together', () => {
    expect(volumeOf({ status: 'ready', bodies: [body(120), body(80)] })).toBe(200);
  });
});
