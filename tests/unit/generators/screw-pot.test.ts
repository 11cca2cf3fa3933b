import { describe, expect, it } from 'vitest';
import { parseParameters } from '@/generators/parameters';
import type { Report } from '@/generators/report';
import screwPot from '@/generators/screw-pot';
import guide from '@/generators/screw-pot/guide';
import { discOf, layoutOf, roomVolume, screwOf, threadOf } from '@/generators/screw-pot/layout';
import { parameters, type Values } from '@/generators/screw-pot/schema';
import { createKernelHost } from '@/lib/geometry/host';
import { type Kernel, type Placement, QUALITY } from '@/lib/geometry/kernel';
import { compose, rotation, translation } from '@/lib/geometry/placement';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE } from '@/lib/materials/types';
import { jointOf } from '@/lib/mechanics/screw-sizes';
import { toughPlastic } from '@/tests/support/materials';
import { checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const checked = (changed: Partial<Values> = {}): Report =>
  screwPot.check(values(changed), toughPlastic, DEFAULT_USE);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};
const host = await createKernelHost();
const FLUSH = { body: 'flush', innerDiameter: 50 } as const;

describe('screw pot: room and thread', () => {
  // pi/4 32^2 45 mm3
  it('holds what the cylinder holds', () => {
    expect(roomVolume(values())).toBeCloseTo(36.19, 2);
    expect(figure(checked(), 'room').value).toBeCloseTo(roomVolume(values()), 9);
  });

  it('holds less with a drawn-in neck and with dividers, by cone, neck and walls', () => {
    const p = values(FLUSH);
    const { rim, narrows, room, mouth, floor } = layoutOf(p);
    const slices = 4000;
    let sum = 0;
    for (let i = 0; i < slices; i += 1) {
      const z = floor + ((rim - floor) * (i + 0.5)) / slices;
      const radius = z < narrows ? room : Math.max(mouth, room - (z - narrows));
      sum += Math.PI * radius ** 2 * ((rim - floor) / slices);
    }
    expect(roomVolume(p)).toBeCloseTo(sum / 1000, 3);
    expect(roomVolume(values({ ...FLUSH, divider: 'four' }))).toBeLessThan(roomVolume(p));
  });

  it('chooses a coarser thread for a wider pot, and two starts for a quick lid', () => {
    const pitches = [14, 25, 40, 60, 85].map((innerDiameter) => threadOf(values({ innerDiameter })).pitch);
    expect(pitches).toEqual([2.5, 3, 4, 5, 6]);
    expect(threadOf(values({ thread: 'quick' })).starts).toBe(2);
    const turns = (thread: Values['thread']) => figure(checked({ thread }), 'turns-to-open').value!;
    expect(turns('quick')).toBeLessThan(0.75 * turns('regular'));
    expect(turns('regular')).toBeCloseTo(1.25 + 0.25, 9);
    expect(turns('fine')).toBeGreaterThan(turns('regular'));
  });

  it('stands the thread on the wall of a straight pot and makes a flush lid as wide as the body', () => {
    expect(jointOf(screwOf(values())).thread.rootDiameter).toBeCloseTo(32 + 3.2, 9);
    const p = values(FLUSH);
    expect(jointOf(screwOf(p)).cap.majorDiameter / 2 + p.lidWall).toBeCloseTo(layoutOf(p).body, 9);
  });

  it('carries every turn of the thread in the lid', () => {
    for (const thread of ['regular', 'fine', 'quick'] as const) {
      const sizes = screwOf(values({ thread }));
      expect(jointOf(sizes).engagedTurns).toBeCloseTo(sizes.turns, 9);
    }
  });
});

describe('screw pot: seal', () => {
  it('beds a disc with the seating pressure over the flat of the rim', () => {
    const load = 1.4 * Math.PI * ((16 + 0.8) ** 2 - 16 ** 2);
    const torque = figure(checked(), 'closing-torque');
    expect(torque.handbook).toBeCloseTo(0.3 * load * screwOf(values()).majorDiameter, 6);
    expect(torque.because).toMatch(/Beds the disc/);
  });

  it('needs no torque to bed foam', () => {
    const torque = figure(checked({ seal: 'foam' }), 'closing-torque');
    expect([torque.value, torque.verdict]).toEqual([null, null]);
    expect(torque.because).toMatch(/by themselves/);
  });

  it('lifts the lid by the disc', () => {
    const top = (changed: Partial<Values>) => jointOf(screwOf(values(changed))).capTop;
    expect(top({ sealThickness: 3 }) - top({ sealThickness: 1 })).toBeCloseTo(2, 9);
    expect(discOf(values({ seal: 'land' }))).toBe(0);
  });

  it('speaks of pot and lid', () => {
    const texts = checked().figures.map(({ label, because }) => `${label} ${because}`);
    expect(texts.join(' ')).toMatch(/the lid/);
    for (const text of texts) expect(text).not.toMatch(/\b(cap|neck)\b/i);
  });
});

describe('screw pot: input', () => {
  it('names field, bound and unit of pots that cannot be made', () => {
    expect(refused({ innerDepth: 8 })).toEqual([
      expect.stringMatching(/^innerDepth: Inside depth must be at least \d+\.\d\d mm, so that thread/),
    ]);
    expect(refused({ body: 'flush', innerDiameter: 10 })).toContainEqual(
      expect.stringMatching(/^innerDiameter: Inside diameter must be at least \d+\.\d\d mm: drawn in/),
    );
    expect(refused({ divider: 'four', dividerThickness: 3, innerDiameter: 20 })).toEqual([
      'dividerThickness: Divider thickness must be at most 2.50 mm to leave room between the walls',
    ]);
    expect(refused({ thread: 'own', pitch: 1, clearance: 0.3 })).toContainEqual(
      'clearance: Clearance must be at most 0.18 mm for a pitch of 1 mm, or pot and lid hardly touch',
    );
  });

  it('accepts the depth it names', () => {
    const [message] = refused({ innerDepth: 8 });
    expect(refused({ innerDepth: Number(/least (\d+\.\d\d)/.exec(message!)![1]) })).toEqual([]);
  });

  it('opens every starting point, none over its limit', () => {
    expect(screwPot.presets.length).toBeGreaterThanOrEqual(3);
    for (const preset of screwPot.presets) {
      expect(refused(preset.values), preset.id).toEqual([]);
      const report = screwPot.check(values(preset.values), materialById(preset.material)!, preset.use);
      const worst = report.figures.filter(({ verdict }) => verdict && verdict !== 'within-limit');
      expect(['within-limit', 'close-to-limit'], `${preset.id} ${JSON.stringify(worst)}`).toContain(
        report.verdict,
      );
    }
  });

  it('cautions about food and pressure', () => {
    const cautions = guide.cautions.join(' ');
    for (const word of ['Food', 'pressure', 'licensed practice']) expect(cautions).toContain(word);
  });
});

/** Common volume in mm3 of the pot with lid and disc moved to each place. */
function common(p: Values, places: readonly Placement[]): number[] {
  const found: number[] = [];
  host.build((kernel: Kernel) => {
    const [pot, ...above] = screwPot.build(p, kernel);
    for (const at of places) {
      const moved = above.map(({ solid }) => kernel.place(solid, at));
      found.push(kernel.volume(kernel.intersect([pot!.solid, kernel.union(moved)])));
    }
    return [pot!];
  }, QUALITY.preview);
  return found;
}

const SHAPES = [
  ['straight with a disc', {}],
  ['straight with a land', { seal: 'land' }],
  ['flush and divided', { ...FLUSH, divider: 'three', seal: 'none' }],
  ['quick', { thread: 'quick', seal: 'none' }],
  ['knuckle', { profile: 'knuckle', innerDiameter: 60 }],
  ['slim and fine', { innerDiameter: 12, thread: 'fine', innerDepth: 60 }],
] as const;

describe('screw pot: bodies', () => {
  it.each(SHAPES)('turn freely and touch at the rim: %s', (_, changed) => {
    const p = values(changed as Partial<Values>);
    const { lead } = jointOf(screwOf(p)).thread;
    const unscrewed = [0, 0.2, 0.6, 1.1].map((turn) =>
      compose(translation([0, 0, lead * turn + 1e-3]), rotation('z', 2 * Math.PI * turn)),
    );
    for (const volume of common(p, unscrewed)) expect(volume).toBeLessThan(1e-6);
    const [pressed, lifted] = common(p, [translation([0, 0, -0.02]), translation([0, 0, 1.5])]);
    expect(pressed).toBeGreaterThan(0.1);
    expect(lifted).toBeGreaterThan(0.1);
  });

  it('leave no gap and no overlap between lid and disc', () => {
    const meet = (lift: number) => {
      let volume = 0;
      host.build((kernel) => {
        const [, lid, disc] = screwPot.build(values(), kernel);
        const moved = kernel.place(disc!.solid, translation([0, 0, lift]));
        volume = kernel.volume(kernel.intersect([lid!.solid, moved]));
        return [lid!];
      }, QUALITY.preview);
      return volume;
    };
    expect(meet(-1e-3)).toBeLessThan(1e-6);
    expect(meet(0.02)).toBeGreaterThan(1);
  });

  it('are closed, of the expected volume and size, at 60 random valid designs', async () => {
    await checkFamilySolids(screwPot, {
      runs: 60,
      seed: 41,
      also: (drawn, bodies) => {
        const p = drawn as Values;
        const { rim, bottom } = layoutOf(p);
        const { capTop, capMouth } = jointOf(screwOf(p));
        const names = discOf(p) > 0 ? ['pot', 'lid', 'disc'] : ['pot', 'lid'];
        expect(bodies.map(({ name }) => name)).toEqual(names);
        const [pot, lid] = [bodies[0]!.bounds, bodies[1]!.bounds];
        expect(pot[2]).toBeCloseTo(bottom, 3);
        expect(pot[5]).toBeCloseTo(rim, 3);
        expect(rim - bottom).toBeCloseTo(p.innerDepth + p.floor, 9);
        expect(lid[2]).toBeCloseTo(capMouth, 3);
        expect(lid[5]).toBeCloseTo(capTop, 3);
      },
    });
  }, 120_000);
});

describe('screw pot: motion', () => {
  it('turns lid and disc together and leaves the pot standing', () => {
    const motion = screwPot.motion(values(), toughPlastic);
    const rest = Float32Array.of(12, 0, 3);
    const posed = (body: string, t: number) => {
      const out = { positions: new Float32Array(3), strain: new Float32Array(1) };
      motion.pose(body, rest, t, out);
      return [...out.positions];
    };
    expect(posed('pot', 0.4)).toEqual([12, 0, 3]);
    expect(posed('disc', 0.6)).toEqual(posed('lid', 0.6));
    expect(posed('lid', 0)[2]).toBeGreaterThan(15);
    for (const [at, value] of [12, 0, 3].entries()) expect(posed('lid', 1)[at]).toBeCloseTo(value, 5);
  });

  it('draws dimensions whose ends lie as far apart as they say', () => {
    for (const changed of [{}, FLUSH, { seal: 'land' as const }]) {
      for (const { field, from, to, value } of screwPot.callouts(values(changed))) {
        expect(Math.hypot(...from.map((one, at) => one - to[at]!)), field).toBeCloseTo(value, 6);
        expect(value).toBe(values(changed)[field as keyof Values]);
      }
    }
  });
});
