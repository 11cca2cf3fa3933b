import type { Material } from '@/lib/materials/types';
import type { Motion, Posed } from '../contract';
import { latchStrain } from './mechanics';
import { barHeight, type Values } from './schema';

/**
 * Turns the rocker about the bars until the nose clears the edge: nose down, tail up. Along each bar the turn falls
 * evenly from the rocker to the frame. Surface strain of the bars grows from their axis outward.
 */
export function motion(p: Values, material: Material): Motion {
  const strain = latchStrain(p, material.poisson.value);
  const axis = barHeight(p) / 2;
  const inner = p.rockerWidth / 2;
  const reach = Math.hypot(p.barShape === 'round' ? 0 : p.barWidth / 2, axis) || 1;

  /** Share of the turn at a distance across the panel: all of it on the rocker, none on the frame. */
  const share = (y: number): number =>
    Math.max(0, Math.min(1, (inner + p.barLength - Math.abs(y)) / p.barLength));

  function pose(_body: string, rest: Float32Array, t: number, out: Posed): void {
    for (let i = 0; i < rest.length; i += 3) {
      const [x, y, z] = [rest[i]!, rest[i + 1]!, rest[i + 2]!];
      const turning = share(y);
      const angle = onBarOrRocker(x, y) ? strain.turn * t * turning : 0;
      const [c, s] = [Math.cos(angle), Math.sin(angle)];
      out.positions[i] = x * c + (z - axis) * s;
      out.positions[i + 1] = y;
      out.positions[i + 2] = axis - x * s + (z - axis) * c;
      const twisted = turning > 0 && turning < 1 && onBarOrRocker(x, y);
      out.strain[i / 3] = twisted ? t * strain.bar * Math.min(1, Math.hypot(x, z - axis) / reach) : 0;
    }
  }

  /** The frame's back rail spans the middle behind the tail and must not turn. */
  function onBarOrRocker(x: number, y: number): boolean {
    if (Math.abs(y) <= inner + 1e-6) return x > -p.tailArm - p.gap / 2;
    return Math.abs(x) <= Math.max(p.barWidth, p.barDiameter) / 2 + p.barFillet + 1e-3;
  }

  return {
    label: 'Press the tail',
    from: 'at rest',
    to: 'nose clear of the edge',
    peakStrain: strain.peak,
    pose,
  };
}
