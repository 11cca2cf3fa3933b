/**
 * Largest stress of a cycle, MPa, that flat printed PLA survives `cycles` times with 90 % probability, unnotched:
 * sigma_max(N) = 0.1 UTS (2e6 / N)^(1/5.5), UTS tensile strength in MPa. Valid from about 1e3 to 2e6 cycles.
 * Source: Ezeh & Susmel, Int. J. Fatigue 126 (2019) 319-326 (as quoted).
 */
export function fatigueStress(tensileStrength: number, cycles: number): number | null {
  if (!(cycles >= 1e3 && cycles <= 2e6)) return null;
  return 0.1 * tensileStrength * (2e6 / cycles) ** (1 / 5.5);
}
