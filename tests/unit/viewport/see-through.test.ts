import { describe, expect, it } from 'vitest';
import { rampTexture, type SurfaceLook, surfaceMaterial } from '@/components/viewport/three/surface-material';

const look = (other: Partial<SurfaceLook>): SurfaceLook => ({
  colour: '#0b6b75',
  line: '#0f2a2e',
  rim: '#0f2a2e',
  seeThrough: true,
  strained: false,
  scaleEnd: 0.01,
  allowable: 0.01,
  layerStep: 0,
  planes: [],
  ...other,
});

function opacityOf(other: Partial<SurfaceLook>): number {
  const { material, apply } = surfaceMaterial(rampTexture());
  apply(look(other));
  return material.opacity;
}

describe('a body that is seen through', () => {
  it('covers what is under it enough to be there, like the top of a cap over its neck', () => {
    expect(opacityOf({})).toBeGreaterThan(0.5);
    expect(opacityOf({})).toBeLessThan(0.75);
  });

  it('leaves at least half of the strain colours under it', () => {
    expect(opacityOf({ strained: true })).toBe(0.5);
  });

  it('is told apart from one that is solid', () => {
    expect(opacityOf({ seeThrough: false })).toBe(1);
  });
});
