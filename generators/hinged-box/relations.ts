import type { Relation } from '../parameters';
import {
  axisHeight,
  bearing,
  boxRim,
  closedHeight,
  frontOuter,
  halfWidth,
  keeperTop,
  lipThickness,
  noseEnd,
  notchMiddle,
  rebateDepth,
  webBottom,
} from './layout';
import type { Values } from './schema';

const LEAST_LIP = 0.6;
const up = (value: number): string => (Math.ceil(value * 10 - 1e-6) / 10).toFixed(1);
const down = (value: number): string => (Math.floor(value * 10 + 1e-6) / 10).toFixed(1);

/** How far the front of the lid moves inward while it rises over the lip, mm: the lid turns, it does not lift. */
const swing = (p: Values): number =>
  (p.lipHeight * (boxRim(p) - axisHeight(p) + p.lipHeight / 2)) / (frontOuter(p) - lipThickness(p));

const leastArm = (p: Values): number => p.armLength + keeperTop(p) - boxRim(p);
const mostArm = (p: Values): number => closedHeight(p) - p.floor - (noseEnd(p) - p.armLength);

export const relations: readonly Relation<Values>[] = [
  {
    id: 'lid-no-deeper',
    field: 'lidHeight',
    severity: 'refuse',
    holds: (p) => p.lidHeight <= p.boxHeight,
    message: (p) => `Inside height of the lid must be at most ${p.boxHeight} mm, that of the box`,
  },
  {
    id: 'lip-in-wall',
    field: 'wall',
    severity: 'refuse',
    holds: (p) => p.lipHeight === 0 || lipThickness(p) >= LEAST_LIP - 1e-9,
    message: (p) =>
      `Wall must be at least ${up(2 * LEAST_LIP + p.clearance)} mm to be shared by lip and lid, or the lip 0`,
  },
  {
    id: 'rebate-in-lid',
    field: 'lidHeight',
    severity: 'refuse',
    holds: (p) => p.lipHeight === 0 || p.lidHeight >= rebateDepth(p) + 0.5 - 1e-9,
    message: (p) => `Inside height of the lid must be at least ${up(rebateDepth(p) + 0.5)} mm for this lip`,
  },
  {
    id: 'lip-clears-swing',
    field: 'lipHeight',
    severity: 'refuse',
    holds: (p) => swing(p) <= 0.8 * p.clearance + 1e-9,
    message: (p) =>
      `Alignment lip moves the turning lid by ${swing(p).toFixed(2)} mm, at most ${(0.8 * p.clearance).toFixed(2)} mm fits the clearance: make it lower`,
  },
  {
    id: 'corner-in-box',
    field: 'cornerRadius',
    severity: 'refuse',
    holds: (p) => p.cornerRadius <= Math.min(p.innerDepth, p.innerLength / 2) - 1,
    message: (p) =>
      `Front corner radius must be at most ${down(Math.min(p.innerDepth, p.innerLength / 2) - 1)} mm`,
  },
  {
    id: 'fillets-in-web',
    field: 'webFillet',
    severity: 'refuse',
    holds: (p) => 2 * p.webFillet <= 0.8 * p.webLength + 1e-9,
    message: (p) => `Web fillet must be at most ${(0.4 * p.webLength).toFixed(2)} mm, 0.4 of the web length`,
  },
  {
    id: 'web-above-bed',
    field: 'webRecess',
    severity: 'refuse',
    holds: (p) => webBottom(p) - p.webFillet >= 1 - 1e-9,
    message: (p) =>
      `Web below the rim must be at most ${(p.webRecess + webBottom(p) - p.webFillet - 1).toFixed(2)} mm, with 1 mm of wall under the web`,
  },
  {
    id: 'arm-reaches-keeper',
    field: 'armLength',
    severity: 'refuse',
    holds: (p) => keeperTop(p) <= boxRim(p) + 1e-9,
    message: (p) =>
      `Catch arm length must be at least ${up(leastArm(p))} mm to reach a keeper under the rim of the box`,
  },
  {
    id: 'arm-above-floor',
    field: 'armLength',
    severity: 'refuse',
    holds: (p) => p.armLength <= mostArm(p) + 1e-9,
    message: (p) =>
      `Catch arm length must be at most ${down(mostArm(p))} mm, or its nose stands below the closed box`,
  },
  {
    id: 'keeper-above-bed',
    field: 'returnAngle',
    severity: 'refuse',
    holds: (p) => closedHeight(p) - p.floor - bearing(p) >= 2 * p.undercut,
    message: (p) =>
      `Return angle needs ${up(2 * p.undercut)} mm under the keeper: shorten the arm or steepen the angle`,
  },
  {
    id: 'undercut-past-clearance',
    field: 'undercut',
    severity: 'refuse',
    holds: (p) => p.undercut >= p.clearance + 0.2 - 1e-9,
    message: (p) => `Undercut must be at least ${up(p.clearance + 0.2)} mm, 0.2 mm more than the clearance`,
  },
  {
    id: 'fillet-beside-wall',
    field: 'armFillet',
    severity: 'refuse',
    holds: (p) => p.armFillet <= p.undercut + p.clearance + 1e-9,
    message: (p) =>
      `Catch arm fillet must be at most ${down(p.undercut + p.clearance)} mm, the space between arm and wall`,
  },
  {
    id: 'catch-on-front',
    field: 'armWidth',
    severity: 'refuse',
    holds: (p) => p.armWidth / 2 + 1.5 <= halfWidth(p) - p.cornerRadius - 0.5,
    message: (p) =>
      `Catch arm width must be at most ${down(2 * (halfWidth(p) - p.cornerRadius - 2))} mm, between the front corners`,
  },
  {
    id: 'notch-on-front',
    field: 'notchWidth',
    severity: 'refuse',
    holds: (p) =>
      p.notchWidth === 0 ||
      notchMiddle(p) + p.notchWidth / 2 <= halfWidth(p) - Math.max(p.cornerRadius, p.wall),
    message: (p) =>
      `Finger notch must be at most ${down(Math.max(0, halfWidth(p) - Math.max(p.cornerRadius, p.wall) - p.armWidth / 2 - 2))} mm beside the catch`,
  },
  {
    id: 'web-bridges',
    field: 'webLength',
    severity: 'warn',
    holds: (p) => p.webLength <= 5,
    message: () => 'Web length over 5 mm sags as a bridge',
  },
];
