import {
  type InternalThread,
  internalThread,
  type ThreadBasics,
  type ThreadSize,
  threadBasics,
} from './thread';
import { capOutline, type FormPoint, neckOutline } from './thread-outline';

export type SealKind = 'land' | 'plug' | 'none';

/** What a neck and its cap are made to. Lengths in mm. */
export interface JointSizes extends ThreadSize {
  /** turns of each ridge between its two points of half height */
  readonly turns: number;
  /** gap per side: radial at crest and root, axial at the flanks */
  readonly clearance: number;
  readonly neckHeight: number;
  readonly bore: number;
  readonly wall: number;
  readonly capHeight: number;
  readonly topThickness: number;
  readonly seal: SealKind;
}

/** Gaps below the last turn of the neck, mm. */
const SHOULDER_GAP = 0.3;
const FADE_HALF = 0.125;
export const LAND_HEIGHT = 0.6;
/** Two extrusion lines: narrow, so that little pull beds it. */
const LAND_WIDTH = 0.8;

export interface ThreadJoint {
  readonly thread: ThreadBasics;
  readonly cap: InternalThread;
  readonly neckForm: readonly FormPoint[];
  readonly capForm: readonly FormPoint[];
  /** wall of the neck between core and bore */
  readonly neckWall: number;
  readonly rimChamfer: number;
  /** inner and outer radius of the raised land that meets the rim */
  readonly land: { readonly inner: number; readonly outer: number };
  readonly mouthChamfer: number;
  /** heights over the shoulder of the neck, cap screwed home */
  readonly capTop: number;
  readonly capMouth: number;
  /** height of the middle of each ridge at its lower half-height point */
  readonly neckBase: number;
  readonly capBase: number;
  /** position of the cap ridge's lower end along the neck ridge, in turns */
  readonly capFrom: number;
  /** turns of each cap ridge that bear on a neck ridge; 0 or less where the skirt is too short */
  readonly engagedTurns: number;
  /** from the rim to the first turn of the neck */
  readonly rimGap: number;
  /** least neck height for these turns, and least cap height for all of them */
  readonly neckHeightNeeded: number;
  readonly capHeightNeeded: number;
  /** axial length over which threads bear, all turns */
  readonly engagedLength: number;
}

const clamp = (value: number, low: number, high: number): number => Math.min(high, Math.max(low, value));

/**
 * Where everything lies in a neck and cap screwed home. The cap's ridge lies half a pitch under the neck's, in the
 * middle of its groove; both begin at the same place below the rim, and the cap's ends where its skirt ends. Turns are
 * counted between half-height points, so that "one turn" is the one turn of a 400 series neck finish.
 */
export function threadJoint(sizes: JointSizes): ThreadJoint {
  const thread = threadBasics(sizes);
  const cap = internalThread(thread, sizes.clearance);
  const neckForm = neckOutline(thread);
  const capForm = capOutline(thread, sizes.clearance);
  const neckWall = (thread.rootDiameter - sizes.bore) / 2;
  const rimChamfer = clamp(neckWall / 4, 0.2, 0.6);
  const middle = (thread.rootDiameter / 2 - rimChamfer + sizes.bore / 2) / 2;
  const landWidth = Math.min(LAND_WIDTH, neckWall / 2);

  const rimGap = clamp(thread.pitch / 4, 0.6, 1.2);
  const top = neckForm.at(-1)![1];
  const bottom = -neckForm[0]![1];
  const full = thread.lead * (sizes.turns + 2 * FADE_HALF);
  const neckBase = sizes.neckHeight - rimGap - top - thread.lead * (sizes.turns + FADE_HALF);
  const capBase = neckBase - thread.pitch / 2;

  const mouthChamfer = clamp(sizes.wall / 2, 0.3, 0.8);
  const landHeight = sizes.seal === 'land' ? LAND_HEIGHT : 0;
  const capTop = sizes.neckHeight + landHeight + sizes.topThickness;
  const capMouth = capTop - sizes.capHeight;
  const lowest = capMouth + mouthChamfer - capForm[0]![1];
  const capFrom = Math.max(0, (lowest - capBase) / thread.lead + FADE_HALF);
  const engagedTurns = sizes.turns - capFrom;
  return {
    thread,
    cap,
    neckForm,
    capForm,
    neckWall,
    rimChamfer,
    land: { inner: middle - landWidth / 2, outer: middle + landWidth / 2 },
    mouthChamfer,
    capTop,
    capMouth,
    neckBase,
    capBase,
    capFrom,
    engagedTurns,
    rimGap,
    neckHeightNeeded: rimGap + top + full + bottom + SHOULDER_GAP,
    capHeightNeeded: capTop - (capBase - thread.lead * FADE_HALF + capForm[0]![1] - mouthChamfer),
    engagedLength: Math.max(0, engagedTurns) * thread.lead,
  };
}

/** Turns after which a cap that is screwed off hangs free of the neck's ridges. */
export function turnsToFree({ thread, neckForm, capForm, engagedTurns }: ThreadJoint): number {
  const overlap = neckForm.at(-1)![1] - capForm[0]![1] + thread.pitch / 2;
  return engagedTurns + 2 * FADE_HALF + overlap / thread.lead;
}
