/**
 * How the third direction is treated. plane-stress: narrow parts, free to thin; plane-strain: parts much wider than
 * thick; axisymmetric: x is the radius, y the axis, the strain round the axis counts.
 */
export type Plane = 'plane-stress' | 'plane-strain' | 'axisymmetric';

/** Strain components that take part, in the order 11, 22, 12 and, round the axis, 33. */
export const strainRows = (plane: Plane): 3 | 4 => (plane === 'axisymmetric' ? 4 : 3);
