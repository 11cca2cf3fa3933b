import { capRidgeWidth } from './thread';
import { type JointSizes, type ThreadJoint, threadJoint } from './thread-joint';

/** A neck and its screwed cap, with the plug where the seal is one. Lengths in mm. */
export interface ScrewSizes extends JointSizes {
  /** plug larger than the bore, on the diameter */
  readonly plugInterference: number;
  readonly plugLength: number;
  readonly plugWall: number;
}

const joints = new WeakMap<ScrewSizes, ThreadJoint>();

/** The joint of these sizes; relations, check and shape ask for it again and again, so it is kept with them. */
export function jointOf(sizes: ScrewSizes): ThreadJoint {
  const known = joints.get(sizes);
  if (known) return known;
  const joint = threadJoint(sizes);
  joints.set(sizes, joint);
  return joint;
}

/** Inner diameter of the ring plug, mm; 0 where so little would be left open that it is made solid. */
export function plugInner(p: ScrewSizes): number {
  const inner = p.bore + p.plugInterference - 2 * p.plugWall;
  return inner < 1 ? 0 : inner;
}

/** 45 degree chamfers of a plug seal, mm: at the mouth of the bore, at the tip of the plug. */
export function plugChamfers(p: ScrewSizes): { readonly bore: number; readonly tip: number } {
  const plugWall = (p.bore + p.plugInterference - plugInner(p)) / 2;
  return {
    bore: Math.min(jointOf(p).neckWall / 3, p.plugInterference / 2 + 0.2),
    tip: Math.min(0.4, plugWall / 2),
  };
}

/** Length over which a plug touches the bore, mm. */
export function plugContact(p: ScrewSizes): number {
  const { bore, tip } = plugChamfers(p);
  return Math.max(0, p.plugLength - bore - tip);
}

/** Longest plug that ends inside the skirt, mm. */
export const plugRoom = (p: ScrewSizes): number => p.neckHeight - jointOf(p).capMouth - 0.2;

/** Radial overlap left between the threads, mm. */
export const overlap = (p: ScrewSizes): number => jointOf(p).thread.engagement - p.clearance;

/** Axial width of the cap ridge's crest, mm. */
export function crestWidth(p: ScrewSizes): number {
  const { thread, cap } = jointOf(p);
  if (p.profile === 'knuckle') return thread.pitch / 4 - p.clearance;
  return capRidgeWidth(thread, p.clearance, cap.minorDiameter / 2);
}

/** Axial width of a ridge of the neck at its root, mm. */
export function ridgeRootWidth(p: ScrewSizes): number {
  const { neckForm } = jointOf(p);
  return neckForm.at(-1)![1] - neckForm[0]![1];
}
