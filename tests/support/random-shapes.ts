import type { BendingModel } from '@/lib/fea/model';
import { cantileverModel } from '@/lib/fea/shapes/cantilever';
import { openRingModel } from '@/lib/fea/shapes/open-ring';
import { tubeModel } from '@/lib/fea/shapes/tube';
import { uArmModel } from '@/lib/fea/shapes/u-arm';
import { webModel } from '@/lib/fea/shapes/web';

/** Numbers from 0 to 1 in a fixed order (mulberry32), so that a failure can be repeated. */
export function randomNumbers(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

type Between = (low: number, high: number) => number;

const DEGREE = Math.PI / 180;

function hook(between: Between): BendingModel {
  const thickness = between(0.8, 4);
  const length = thickness * between(3, 12);
  const fillet = thickness * between(0.1, 0.8);
  const tipThickness = thickness * between(0.5, 1);
  const onBlock = between(0, 1) < 0.5;
  return cantileverModel({
    length,
    thickness,
    tipThickness,
    catch: {
      height: thickness * between(0.3, 1),
      land: between(0.3, 1.5),
      lead: between(20, 50) * DEGREE,
      back: between(45, 90) * DEGREE,
    },
    root: {
      kind: 'base',
      thickness: onBlock ? between(8, 15) : between(1, 4),
      span: 2.2 * (thickness + 2 * fillet) + between(2, 20),
      bottom: onBlock,
    },
    fillets: { front: fillet, back: fillet * between(0.5, 1) },
    width: { kind: 'even', width: between(3, 12) },
    deflection: length * between(0.02, 0.15),
  });
}

function ring(between: Between): BendingModel {
  const radius = between(3, 15);
  const thickness = radius * between(0.1, 0.4);
  const outer = radius + thickness;
  return openRingModel({
    radius,
    thickness,
    opening: between(50, 150) * DEGREE,
    lips: between(0, 1) < 0.5 ? 'round' : 'cut',
    foot:
      between(0, 1) < 0.7
        ? { width: outer * between(0.4, 1.2), depth: between(1, 4), fillet: thickness * between(0.2, 1) }
        : null,
    width: between(4, 12),
    spread: radius * between(0.05, 0.3),
  });
}

function uArm(between: Between): BendingModel {
  const thickness = between(0.8, 2.5);
  const fillet = thickness * between(0.2, 0.6);
  const rise = between(8, 20);
  return uArmModel({
    rise,
    fall: rise * between(0.4, 0.9),
    bend: between(0.8, 4),
    thickness,
    root: { kind: 'base', thickness: between(2, 6), span: between(20, 30), bottom: false },
    fillets: { front: fillet, back: fillet },
    width: between(4, 10),
    opening: between(-0.5, 2),
  });
}

function web(between: Between): BendingModel {
  const thickness = between(0.2, 0.8);
  const leaf = thickness + between(0.8, 2.5);
  const relief = between(0, 1) < 0.5 ? 0 : ((leaf - thickness) / 2) * between(0.3, 1);
  const length = between(0.8, 8);
  return webModel({
    length,
    thickness,
    leaf,
    leafLength: leaf * between(1, 2.5),
    fillet: Math.min(leaf - thickness - relief, length / 2) * between(0.2, 0.9),
    relief,
    angle: between(30, 180) * DEGREE,
    width: between(5, 30),
  });
}

function tube(between: Between): BendingModel {
  const innerRadius = between(5, 30);
  const wall = between(0.8, 3);
  const length = between(8, 40);
  const band = wall * between(0.3, 1);
  return tubeModel({
    innerRadius,
    wall,
    length,
    band,
    pressedAt: between(0, length - band),
    growth: between(0.1, 0.5),
  });
}

export const RANDOM_SHAPES: Readonly<Record<string, (between: Between) => BendingModel>> = {
  hook,
  ring,
  'U arm': uArm,
  web,
  tube,
};

/** A stream of random models of one shape; dimensions that do not fit together are drawn again. */
export function* randomModels(shape: string, count: number, seed = 1): Generator<BendingModel> {
  const next = randomNumbers(seed);
  const between: Between = (low, high) => low + (high - low) * next();
  for (let made = 0; made < count; ) {
    const model = attempt(() => RANDOM_SHAPES[shape]!(between));
    if (!model) continue;
    made++;
    yield model;
  }
}

function attempt(make: () => BendingModel): BendingModel | null {
  try {
    return make();
  } catch (error) {
    if (error instanceof RangeError) return null;
    throw error;
  }
}
