/**
 * Short arms on a sharp, rigid root, as in textbooks: what shear and the root's edge add to slender-beam figures.
 * Arms with a fillet on a body that gives use `large-deflection.ts` and `fillet.ts` instead. l is length over thickness.
 */

/** Stiffness over the slender beam's, 1 / (1 + 0.836 / l^2). Valid l >= 2, within 0.6 %; fitted to finite elements. */
export const shortStiffness = (slenderness: number): number => 1 / (1 + 0.836 / slenderness ** 2);

/** Strain at the root's edge over nominal at the same load, 1 + 0.27 / l. Valid l >= 2, within 0.5 %; fitted likewise. */
export const sharpRootStrain = (slenderness: number): number => 1 + 0.27 / slenderness;

/**
 * Arms that narrow from root to tip unload the edges of their root and load its middle: strain at mid-width over
 * nominal, 1.08 for a width falling to a quarter; in proportion for less. Fitted to finite elements.
 */
export const narrowingStrain = (widthRatio: number): number => 1 + (0.08 * (1 - widthRatio)) / 0.75;
