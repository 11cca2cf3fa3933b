/**
 * Thin web of a hinge between two thicker leaves, folded by an angle.
 *
 * Handbook: mean-line strip, eps = t theta / (2 L); elastic strip length L = theta E t / (2 sigma_y); moment
 * M = E b t^3 theta / (12 L), fully plastic M_p = sigma_y b t^2 / 4 (geometry; articles on hinge geometry).
 *
 * Corrected: eps_peak = Kt (t theta / (2 Leff)) (1 + 0.08 t theta / (2 L)), with
 * - Leff = L + dL: the leaf's edge gives a little and lengthens the web, its fillets stiffen and shorten it;
 * - Kt at the end of the fillet, one-sided where the web lies flush with a leaf face, two-sided where it is recessed;
 * - the last factor for large rotation (tension side of a neo-Hookean web).
 * dL and Kt are fits of plane linear finite elements made for this project (94 webs: leaf 1.5 to 3 mm, web 0.4 and
 * 0.6 mm, fillet 0.25 to 1 t, recess 0 to centred; Kt within 2 %, dL within 0.13 t), checked against the independent
 * neo-Hookean reference (22 cases, within 4 %). Lengths mm, angles rad, strain as a fraction, tension positive.
 */

/** Which leaf face lies inside the fold: the one the web is (nearly) flush with, or the one with the groove. */
export type FoldSide = 'flat-face' | 'groove';

export interface Web {
  /** free length between the leaves */
  readonly length: number;
  readonly thickness: number;
  readonly leafThickness: number;
  /** depth of the web's flat face below the leaf's flat face; 0 is flush */
  readonly relief: number;
  /** radius on the groove side */
  readonly fillet: number;
  readonly foldTowards: FoldSide;
}

/** Strain of an evenly bent strip, eps = t theta / (2 L). */
export const stripStrain = (thickness: number, length: number, angle: number): number =>
  (thickness * angle) / (2 * length);

/** Strain at an inner bend radius, eps = t / (2 R + t). */
export const bendStrain = (thickness: number, innerRadius: number): number =>
  thickness / (2 * innerRadius + thickness);

/** Strip length that stays under a strain, L = t theta / (2 eps). */
export const stripLength = (thickness: number, angle: number, strain: number): number =>
  (thickness * angle) / (2 * strain);

/** Strip length that stays elastic, L = theta E t / (2 sigma_y); E and sigma_y in MPa. */
export const elasticStripLength = (
  thickness: number,
  angle: number,
  modulus: number,
  yieldStress: number,
): number => stripLength(thickness, angle, yieldStress / modulus);

/** Radius the flat side can carry: the groove fillet, but never more than the recess. */
export const reliefFillet = (web: Web): number => Math.min(web.fillet, web.relief);

/** 1 for a web flush with a face, 0 from a recess of one and a half fillets on. */
const flushness = ({ relief, fillet }: Web): number => Math.max(0, 1 - relief / (1.5 * fillet));

const twoSided = (x: number): number => 1 + 0.149 * x ** -0.855;
const oneSided = (x: number): number => 1 + 0.21 * x ** -0.84;

/** Concentration at the end of the fillet on the stretched side. */
export function filletFactor(web: Web): number {
  const share = flushness(web);
  if (web.foldTowards === 'groove') {
    const radius = reliefFillet(web);
    const recessed = radius > 0 ? twoSided(Math.max(radius / web.thickness, 0.05)) : 1;
    return share >= 1 ? 1 : recessed;
  }
  const x = web.fillet / web.thickness;
  return share * oneSided(x) + (1 - share) * twoSided(x);
}

/** What the leaves' edges and the fillets add to the bending length, mm; may be negative. */
export function addedLength(web: Web): number {
  const slender = (web.thickness / web.leafThickness) ** 2;
  const top = web.fillet / web.thickness;
  const bottom = reliefFillet(web) / web.thickness;
  const recessed = 0.89 - 1.25 * slender - 0.715 * (top + bottom);
  const flush = 1.325 - 1.6 * slender - 1.07 * top - 0.17 * top * top;
  const share = flushness(web) ** 2;
  return web.thickness * (share * flush + (1 - share) * recessed);
}

/** Length over which the fold is spread, mm. */
export const bendingLength = (web: Web): number => web.length + addedLength(web);

/** Growth of the tension strain by large rotation at a nominal strain. */
const largeRotation = (nominal: number): number => 1 + 0.08 * nominal;

export interface WebStrain {
  /** stretched surface in the middle of the web */
  readonly middle: number;
  /** stretched surface at the end of the fillet */
  readonly end: number;
  readonly peak: number;
}

/**
 * Surface strain of the web at a fold angle. `middleFactor` and `endFactor` are curvatures against the even bend,
 * other than 1 only where the leaves are pressed shut (see fold.ts).
 */
export function webStrain(web: Web, angle: number, middleFactor = 1, endFactor = 1): WebStrain {
  const even = stripStrain(web.thickness, bendingLength(web), angle);
  const grown = even * largeRotation(stripStrain(web.thickness, web.length, angle));
  const middle = grown * middleFactor;
  const end = grown * endFactor * filletFactor(web);
  return { middle, end, peak: Math.max(middle, end) };
}

/** Distance from the middle of the web to the leaf face inside the fold. */
export function insideDepth(web: Web): number {
  const flat = web.relief + web.thickness / 2;
  return web.foldTowards === 'flat-face' ? flat : web.leafThickness - flat;
}

/** Fold angle at which the leaf edges meet when the web bends evenly: L / depth, rad. */
export const meetingAngle = (web: Web): number => web.length / insideDepth(web);

export interface FoldMoment {
  /** elastic moment of the fold, N mm */
  readonly elastic: number;
  /** moment the web cannot exceed once it yields through, N mm; null when the yield stress is not known */
  readonly plastic: number | null;
}

/**
 * Moment to hold the fold. The web is wide against its thickness, so the corrected stiffness is that of plane strain,
 * E / (1 - nu^2). Modulus and yield stress in MPa, width mm.
 */
export function foldMoment(
  web: Web,
  angle: number,
  width: number,
  elastic: { modulus: number; poisson: number; yieldStress: number | null },
): FoldMoment {
  const plate = elastic.modulus / (1 - elastic.poisson ** 2);
  return {
    elastic: (plate * width * web.thickness ** 3 * angle) / (12 * bendingLength(web)),
    plastic: elastic.yieldStress === null ? null : (elastic.yieldStress * width * web.thickness ** 2) / 4,
  };
}
