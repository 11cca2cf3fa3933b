import { describe, expect, it } from 'vitest';
import { clearanceFor, type Fit, type FitProfile } from '@/lib/printing/clearance';

const printed = (id: string) => ({ id, process: 'printed' }) as const;
const measured: FitProfile = { gaps: { slip: 0.27 }, source: { text: 'coupon', mark: 'given' } };

describe('clearances', () => {
  // Clearance notes for desktop printers (as quoted), mm a side.
  it.each<[Fit, number, number]>([
    ['press', -0.05, 0.05],
    ['snug', 0.1, 0.2],
    ['slip', 0.2, 0.3],
    ['free', 0.4, 0.4],
  ])('of a %s fit are %f mm in PLA and %f mm in PETG, as noted', (fit, pla, petg) => {
    expect(clearanceFor(printed('pla'), fit)?.value).toBe(pla);
    expect(clearanceFor(printed('petg'), fit)?.value).toBe(petg);
  });

  it('follow what was measured where it was, and the notes elsewhere', () => {
    expect(clearanceFor(printed('petg'), 'slip', measured)).toEqual({ value: 0.27, source: measured.source });
    expect(clearanceFor(printed('petg'), 'free', measured)?.value).toBe(0.4);
  });

  it('are not known for moulded plastics', () => {
    expect(clearanceFor({ id: 'pom-moulded', process: 'moulded' }, 'slip')).toBeNull();
  });
});
