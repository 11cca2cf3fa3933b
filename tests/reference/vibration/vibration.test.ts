import { describe, expect, it } from 'vitest';
import {
  dropDeflection,
  GRAVITY,
  ISOLATES_FROM,
  naturalFrequency,
  staticSag,
  transmissibility,
} from '@/lib/mechanics/vibration';

describe('one mass on one spring', () => {
  // Den Hartog, Mechanical Vibrations (from memory): f = 15.76 Hz over the root of the static sag in mm, f = sqrt(g/d)/(2 pi).
  it.each([1, 4, 0.25])('has the frequency that goes with a static sag of %f mm', (sag) => {
    const stiffness = (0.5 * GRAVITY) / sag;
    expect(staticSag(500, stiffness)).toBeCloseTo(sag, 12);
    expect(naturalFrequency(500, stiffness)).toBeCloseTo(15.76 / Math.sqrt(sag), 1);
  });

  it('sends on all of a slow shaking, and as much at root two whatever its damping', () => {
    expect(transmissibility(0, 0.1)).toBe(1);
    for (const damping of [0, 0.05, 0.2, 1]) {
      expect(transmissibility(ISOLATES_FROM, damping)).toBeCloseTo(1, 12);
    }
  });

  // 1 / (2 z) at resonance for little damping; 1 / (r^2 - 1) undamped above it.
  it('grows to half over the damping at resonance and falls with the square above it', () => {
    expect(transmissibility(1, 0.02)).toBeCloseTo(25, 1);
    expect(transmissibility(5, 0)).toBeCloseTo(1 / 24, 12);
  });

  // Suddenly let go, a mass sinks to twice its static sag; a high fall tends to sqrt(2 d h).
  it('sinks to twice the sag when let go, and balances its energy after a fall', () => {
    expect(dropDeflection(0.3, 0)).toBeCloseTo(0.6, 12);
    const [sag, fall] = [0.3, 12];
    const x = dropDeflection(sag, fall);
    expect(x ** 2 / (2 * sag)).toBeCloseTo(fall + x, 9);
  });
});
