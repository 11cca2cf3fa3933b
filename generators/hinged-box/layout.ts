import { radians } from '@/lib/units';
import type { Values } from './schema';

/**
 * Dimensions that follow, mm. u counts from the fold line across box or lid, z from the bed; both halves lie open side
 * by side. Closed, a point of the lid at (u, z) stands over the box at (u, closedHeight - z).
 */
export const backOuter = (p: Values): number => p.webLength / 2;
export const backInner = (p: Values): number => backOuter(p) + p.wall;
export const frontInner = (p: Values): number => backInner(p) + p.innerDepth;
export const frontOuter = (p: Values): number => frontInner(p) + p.wall;
export const halfWidth = (p: Values): number => p.innerLength / 2 + p.wall;

/** Rims of box and lid at sides and front. */
export const boxRim = (p: Values): number => p.floor + p.boxHeight;
export const lidRim = (p: Values): number => p.floor + p.lidHeight;
/** Rim of both back walls: half-way, for the lid turns about it. */
export const backRim = (p: Values): number => (boxRim(p) + lidRim(p)) / 2;
/** Height of the axis the lid turns about. */
export const axisHeight = (p: Values): number => backRim(p) + p.rimGap / 2;
export const closedHeight = (p: Values): number => 2 * axisHeight(p);

export const webTop = (p: Values): number => backRim(p) - p.webRecess;
export const webBottom = (p: Values): number => webTop(p) - p.webThickness;

/** Wall left for the lip, and for the lid beside it. */
export const lipThickness = (p: Values): number => (p.wall - p.clearance) / 2;
export const rebateDepth = (p: Values): number => p.lipHeight + p.clearance;

/** Inner face of the arm, from the fold line. */
export const armFace = (p: Values): number => frontOuter(p) + p.undercut + p.clearance;
export const LAND = 0.8;
export const leadRun = (p: Values): number => p.undercut / Math.tan(radians(p.leadInAngle));
export const slopeRun = (p: Values, height: number): number =>
  p.returnAngle >= 90 ? 0 : height / Math.tan(radians(p.returnAngle));
/** Along the arm from the lid plate to the end of the nose. */
export const noseEnd = (p: Values): number => p.armLength + LAND + leadRun(p);
/** Along the arm to where the holding face meets the edge of the keeper. */
export const bearing = (p: Values): number => p.armLength - slopeRun(p, p.undercut - p.clearance);

/** Keeper on the front of the box, heights over the bed: its holding edge, its foot on the wall, its top. */
export const keeperEdge = (p: Values): number => closedHeight(p) - p.floor - bearing(p) + p.clearance;
export const keeperFoot = (p: Values): number => keeperEdge(p) - slopeRun(p, p.undercut);
export const keeperTop = (p: Values): number => keeperEdge(p) + LAND + p.undercut;

export const tabEnd = (p: Values): number => armFace(p) + p.armThickness + p.armFillet + 0.5;
export const tabWidth = (p: Values): number => p.armWidth + 3;

export const NOTCH_HEIGHT = 3;
/** Middle of the finger notch, along the fold. */
export const notchMiddle = (p: Values): number => p.armWidth / 2 + 2 + p.notchWidth / 2;
