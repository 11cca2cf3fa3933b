import type { Band, Judgement, Material, Quantity, Source } from '@/lib/materials/types';
import type { Unit } from '@/lib/units';

const MADE_UP: Source = { text: 'round figure for tests', mark: 'given' };

const quantity = (value: number, unit: Unit): Quantity => ({ value, unit, source: MADE_UP });
const band = (low: number, value: number, high: number): Band => ({
  low,
  value,
  high,
  unit: 'ratio',
  source: MADE_UP,
});
const judged: Judgement = { rating: 'unknown', because: 'not part of the test', source: MADE_UP };

/** A tough, soft plastic with round figures: E 1500 MPa, 3 % once, softening secant. */
export const toughPlastic: Material = {
  id: 'tough-test',
  name: 'Tough test plastic',
  shortName: 'Tough',
  process: 'printed',
  summary: 'For tests only.',
  flexuralModulus: quantity(1500, 'MPa'),
  tensileModulus: quantity(1400, 'MPa'),
  tensileModulusAcross: quantity(1200, 'MPa'),
  secant: { kind: 'softening', slope: 12, validTo: 0.04, assumed: true, source: MADE_UP },
  poisson: quantity(0.4, 'ratio'),
  yieldStrain: quantity(0.09, 'strain'),
  tensileStrength: quantity(30, 'MPa'),
  tensileStrengthAcross: quantity(15, 'MPa'),
  allowableOnce: quantity(0.03, 'strain'),
  allowableOften: quantity(0.018, 'strain'),
  allowableAcross: quantity(0.008, 'strain'),
  friction: band(0.2, 0.4, 0.6),
  density: quantity(0.9, 'g/cm3'),
  heatDeflection: quantity(90, 'degC'),
  glassTransition: quantity(-10, 'degC'),
  continuousService: quantity(60, 'degC'),
  thermalExpansion: quantity(1e-4, '1/K'),
  shrinkage: quantity(0.02, 'ratio'),
  print: null,
  weather: judged,
  chemicals: judged,
  gluing: judged,
  foldEndurance: { class: 'long-life', because: 'for tests', source: MADE_UP },
  drawsWhenFolded: true,
  price: null,
};

/** A stiff plastic that takes little strain: E 3200 MPa, 1 % once. */
export const brittlePlastic: Material = {
  ...toughPlastic,
  id: 'brittle-test',
  name: 'Brittle test plastic',
  shortName: 'Brittle',
  flexuralModulus: quantity(3200, 'MPa'),
  tensileModulus: quantity(3400, 'MPa'),
  tensileModulusAcross: quantity(3000, 'MPa'),
  poisson: quantity(0.35, 'ratio'),
  yieldStrain: quantity(0.029, 'strain'),
  tensileStrength: quantity(52, 'MPa'),
  tensileStrengthAcross: quantity(40, 'MPa'),
  allowableOnce: quantity(0.01, 'strain'),
  allowableOften: quantity(0.006, 'strain'),
  allowableAcross: quantity(0.004, 'strain'),
  friction: band(0.25, 0.5, 0.75),
  density: quantity(1.24, 'g/cm3'),
  heatDeflection: quantity(60, 'degC'),
  glassTransition: quantity(61, 'degC'),
  continuousService: quantity(50, 'degC'),
  foldEndurance: { class: 'few', because: 'for tests', source: MADE_UP },
  drawsWhenFolded: false,
};

/** Linear elastic at a fixed modulus, as the finite-element cases assume; everything else as the tough plastic. */
export function linearPlastic(modulus: number, poisson = 0.35, friction = 0.3): Material {
  return {
    ...toughPlastic,
    id: 'linear-test',
    name: 'Linear test plastic',
    shortName: 'Linear',
    flexuralModulus: quantity(modulus, 'MPa'),
    secant: { kind: 'constant', slope: 0, validTo: 1, assumed: false, source: MADE_UP },
    poisson: quantity(poisson, 'ratio'),
    friction: band(0.5 * friction, friction, 1.5 * friction),
  };
}
