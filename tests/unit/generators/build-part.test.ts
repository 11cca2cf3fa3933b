import { describe, expect, it } from 'vitest';
import { buildPart, buildPartOnBed } from '@/generators/build-part';
import { createKernelHost } from '@/lib/geometry/host';
import { spacerFamily } from '@/tests/support/spacer-family';

const host = await createKernelHost();
const names = (bodies: readonly { name: string }[]) => bodies.map((body) => body.name);

describe('building a part', () => {
  it('takes the defaults for parameters left out', () => {
    const bodies = buildPart(host, spacerFamily, { parameters: {}, quality: 'preview' });
    expect(names(bodies)).toEqual(['spacer-1', 'spacer-2']);
    expect(bodies[0]!.bounds).toEqual([-10, -10, 0, 10, 10, 5]);
    expect(bodies[1]!.bounds[2]).toBe(6);
  });

  it('lays the bodies on the bed in the best stance', () => {
    const bodies = buildPartOnBed(host, spacerFamily, { parameters: { pieces: 2 }, quality: 'preview' });
    expect(bodies.map((body) => body.bounds)).toEqual([
      [-22.5, -10, 0, -2.5, 10, 5],
      [2.5, -10, 0, 22.5, 10, 5],
    ]);
  });

  it('keeps only the bodies asked for, and lays them as if alone', () => {
    const request = { parameters: { pieces: 3 }, quality: 'preview', bodies: ['spacer-2'] } as const;
    expect(names(buildPart(host, spacerFamily, request))).toEqual(['spacer-2']);
    expect(buildPartOnBed(host, spacerFamily, request)[0]!.bounds).toEqual([-10, -10, 0, 10, 10, 5]);
  });

  it('refuses a body that the part does not have, naming those it has', () => {
    const request = { parameters: {}, quality: 'preview', bodies: ['lid'] } as const;
    expect(() => buildPart(host, spacerFamily, request)).toThrow('bodies must be among spacer-1, spacer-2');
  });

  it('refuses values out of range, naming field and bound', () => {
    const request = { parameters: { height: 900 }, quality: 'preview' } as const;
    expect(() => buildPart(host, spacerFamily, request)).toThrow('Height must be at most 40 mm');
  });

  it('refuses a stance that the family does not know', () => {
    const request = { parameters: {}, quality: 'preview', stance: 'on edge' } as const;
    expect(() => buildPartOnBed(host, spacerFamily, request)).toThrow(
      'stance on edge of spacer was not found',
    );
  });
});
