import { describe, expect, it } from 'vitest';
import { type JointSizes, threadJoint, turnsToFree } from '@/lib/mechanics/thread-joint';

const SIZES: JointSizes = {
  profile: 'printed',
  majorDiameter: 32,
  pitch: 4,
  starts: 1,
  turns: 1.25,
  clearance: 0.2,
  neckHeight: 14,
  bore: 23,
  wall: 2,
  capHeight: 15.6,
  topThickness: 2.4,
  seal: 'land',
};
const joint = (changed: Partial<JointSizes> = {}) => threadJoint({ ...SIZES, ...changed });

describe('a neck and cap screwed home', () => {
  it('lays the ridge of the cap in the middle of the groove under the ridge of the neck', () => {
    const { neckBase, capBase, neckForm, capForm, thread } = joint();
    const neckLoadFlank = neckBase + neckForm[1]![1];
    const capLoadFlank = capBase + capForm[2]![1];
    const reach = neckForm[1]![0] - capForm[2]![0];
    expect(neckLoadFlank - capLoadFlank).toBeCloseTo(0.2 + reach * Math.tan(thread.loadFlank), 9);
  });

  it('engages all turns with a long skirt and fewer with a short one', () => {
    const long = joint();
    expect(long.engagedTurns).toBe(1.25);
    expect(long.engagedLength).toBeCloseTo(5, 9);
    const short = joint({ capHeight: long.capHeightNeeded - 1 });
    expect(short.engagedTurns).toBeCloseTo(1.25 - 1 / 4, 9);
  });

  it('needs exactly the neck height that its turns, fades and gaps take', () => {
    const { neckHeightNeeded, neckForm, rimGap } = joint();
    const width = neckForm.at(-1)![1] - neckForm[0]![1];
    expect(neckHeightNeeded).toBeCloseTo(rimGap + width + 1.5 * 4 + 0.3, 9);
  });

  it('stands the top higher by the land', () => {
    expect(joint().capTop - joint({ seal: 'none' }).capTop).toBeCloseTo(0.6, 9);
  });

  it('keeps the land on the flat of the rim', () => {
    const { land, thread, rimChamfer } = joint();
    expect(land.inner).toBeGreaterThan(23 / 2);
    expect(land.outer).toBeLessThan(thread.rootDiameter / 2 - rimChamfer);
  });

  it('hangs free once the lowest of the cap has passed the highest of the neck', () => {
    const home = joint();
    const lift = home.thread.lead * turnsToFree(home);
    const lowest = home.capBase + home.thread.lead * (home.capFrom - 0.125) + home.capForm[0]![1];
    const highest = home.neckBase + home.thread.lead * (SIZES.turns + 0.125) + home.neckForm.at(-1)![1];
    expect(lowest + lift).toBeCloseTo(highest, 9);
  });
});
