import { plateGive } from './poisson';
import type { RootSection, RootSpring } from './root';
import { sharpRootStrain } from './short-beam';

/**
 * An arm lying in the plane of a panel as thick as its root and bending out of that plane, mm. `depth` runs from the
 * root to the held edge behind it, `span` between the held edges at its sides.
 */
export interface Panel {
  readonly span: number;
  readonly depth: number;
  /** width of the slot that frees the arm inside the panel; null for an arm that grows from the panel's free edge */
  readonly slot: number | null;
}

/** Extent that counts in arm widths: the nearer held edges decide, sides at `ratio` of their distance. */
const extent = (depth: number, span: number, ratio: number, power: number): number =>
  (depth ** -power + (span / ratio) ** -power) ** (-1 / power);

/** phi in E b y / P = turning l^2 + 2 coupling l + shift, l = L/h. */
interface Give {
  readonly turning: number;
  readonly coupling: number;
  readonly shift: number;
}

/** Panel held at both sides and behind, its front edge free. x = b/h, d = depth/b, s = span/b. */
function edgeGive(x: number, d: number, s: number): Give {
  const turned = extent(d, s, 3.06, 6.4);
  const shifted = extent(d, s, 2.47, 6.4);
  return {
    turning: 1.945 * x ** 0.937 * Math.log(1 + (turned / 0.166) ** 2),
    coupling: (4.8 * x ** 1.748 * turned ** 2) / (turned + 0.67),
    shift: 1.677 * x ** 3 * shifted ** 2,
  };
}

/** Panel held all round, the arm freed by a slot of width w = slot/b. */
function slotGive(x: number, d: number, s: number, w: number): Give {
  const turned = extent(d, s, 2.95, 6.62);
  const shifted = extent(d, s, 3.06, 6.62);
  const wide = w / 0.2;
  return {
    turning: 1.126 * x ** 0.937 * wide ** 0.107 * Math.log(1 + (turned / 0.0726) ** 2),
    coupling: 2.099 * x ** 1.748 * wide ** -0.144 * turned,
    shift: 1.02 * x ** 3 * wide ** 1.409 * shifted ** 0.832,
  };
}

/** A rounded corner widens the arm's foot and takes some of the give away. */
const cornerShare = (fillet: number, b: number): number => 1.04 - 0.25 * Math.min(0.4, fillet / b);

/**
 * Give of a panel under the root of an arm in its plane: it turns, and shifts out of its plane.
 * Fitted to finite elements (b/h 1.5 to 6, span/b 1.7 to 12, depth/b 0.35 to 6, slot/b 0.1 to 0.4): force within
 * 2.5 % at a panel's edge, 4.5 % in a slot.
 */
export function panelSprings(panel: Panel, section: RootSection): RootSpring[] {
  const { thickness: h, width: b, fillet, poisson } = section;
  const [x, d, s] = [b / h, panel.depth / b, panel.span / b];
  const give = panel.slot === null ? edgeGive(x, d, s) : slotGive(x, d, s, panel.slot / b);
  const share = cornerShare(fillet, b) * plateGive(poisson);
  const turn = (share * give.turning) / (b * h ** 2);
  const behind = (give.coupling / give.turning) * h;
  return [{ turn, behind, slide: Math.max(0, (share * give.shift) / b - turn * behind ** 2) }];
}

/**
 * Strain at the arm's corner, where its side runs into the panel round the fillet, over nominal at the fillet's
 * tangent: [1 + 0.183 (R/b)^-0.61] (1 + 0.27 h/L) at an edge, 0.198 in a slot. R/b 0.05 to 0.33, L/h from 3; fitted
 * to finite elements, within 6 %.
 */
export function cornerConcentration(
  panel: Panel,
  { thickness, width, fillet }: RootSection,
  length: number,
): number {
  const steep = panel.slot === null ? 0.183 : 0.198;
  return (1 + steep * (fillet / width) ** -0.61) * sharpRootStrain(length / thickness);
}
