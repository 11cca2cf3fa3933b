/**
 * A round peg standing on a strip with a fillet at its root. d peg diameter, r fillet radius, mm; E in MPa; N.
 * Strains as fractions, at the root.
 */
export interface Peg {
  readonly diameter: number;
  readonly fillet: number;
}

/** Fillets outside this range of r/d lie off the published charts; the factor is held at the end. */
const FILLET_RANGE = [0.02, 0.3] as const;

const power = ({ diameter, fillet }: Peg, scale: number, exponent: number): number => {
  const ratio = Math.min(Math.max(fillet / diameter, FILLET_RANGE[0]), FILLET_RANGE[1]);
  return Math.max(1, scale * ratio ** exponent);
};

/** Stress at the root fillet over nominal, pulled along the peg; shaft with a shoulder of twice its diameter. */
export const pulledPegFactor = (peg: Peg): number => power(peg, 1.0147, -0.30035);

/** The same for bending, shoulder of three diameters. Source of both: Norton, Machine Design, fits to Peterson's charts (from memory). */
export const bentPegFactor = (peg: Peg): number => power(peg, 0.89334, -0.3086);

/** Pull along the peg in N that strains its root to `strain`. */
export const pegPull = (peg: Peg, strain: number, modulus: number): number =>
  (strain * modulus * Math.PI * peg.diameter ** 2) / 4 / pulledPegFactor(peg);

/**
 * Sideways pull in N, at `lever` mm above the root, that strains the root to `strain`: the lesser of bending (with
 * the fillet) and shear (4/3 of the mean, principal strain gamma/2). The peg is too stubby to add the two at one point.
 */
export function pegSidePull(
  peg: Peg,
  lever: number,
  strain: number,
  modulus: number,
  poisson: number,
): number {
  const bending = (strain * modulus * Math.PI * peg.diameter ** 3) / (32 * lever) / bentPegFactor(peg);
  const area = (Math.PI * peg.diameter ** 2) / 4;
  const shear = (strain * modulus * area * 3) / (4 * (1 + poisson));
  return Math.min(bending, shear);
}
