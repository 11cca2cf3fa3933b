import fc from 'fast-check';
import { expect } from 'vitest';
import type { Family } from '@/generators/contract';
import type { Field, NumberField, Parameters, ParameterValue } from '@/generators/parameters';
import { createKernelHost } from '@/lib/geometry/host';
import { type BuiltBody, QUALITY, type QualityName } from '@/lib/geometry/kernel';
import { meshFaults } from '@/lib/geometry/mesh-check';

type Values = Readonly<Record<string, ParameterValue>>;

/** How many steps a number lies from its default, or which other choice is taken; shrinks towards the default. */
function arbitraryMove(field: Field): fc.Arbitrary<number> {
  if (field.type === 'toggle') return fc.constantFrom(0, 1);
  if (field.type === 'choice') return fc.nat({ max: field.options.length - 1 });
  const steps = (range: number) => Math.floor(range / field.step + 1e-9);
  return fc.integer({ min: -steps(field.default - field.min), max: steps(field.max - field.default) });
}

function numberAt(field: NumberField, steps: number): number {
  const value = Number((field.default + steps * field.step).toFixed(9));
  return Math.min(field.max, Math.max(field.min, value));
}

function valueAt(field: Field, move: number): ParameterValue {
  if (field.type === 'number') return numberAt(field, move);
  if (field.type === 'toggle') return move === 0 ? field.default : !field.default;
  const others = field.options.map((option) => option.value).filter((value) => value !== field.default);
  return move === 0 ? field.default : others[move - 1]!;
}

/** The move itself, then ever smaller ones: what to try where the relations between fields refuse the whole move. */
function smallerMoves(field: Field, move: number): number[] {
  if (field.type !== 'number') return [move];
  const shares = [1, 0.75, 0.5, 0.25, 0.1].map((share) => Math.trunc(move * share));
  return [...new Set(shares)].filter((steps) => steps !== 0);
}

/**
 * Random valid values of a family. Fields are moved from their defaults one after the other in a random order; a move
 * that a relation refuses is made smaller until it is accepted, and tried again when the others have moved. So every
 * draw is valid and none is thrown away.
 */
export function arbitraryParameters<P>(parameters: Parameters<P>): fc.Arbitrary<P> {
  const fields = Object.entries<Field>(parameters.fields as Record<string, Field>);
  const keys = fields.map(([key]) => key);
  const moves = fc.record(Object.fromEntries(fields.map(([key, field]) => [key, arbitraryMove(field)])));
  const orders = fc.shuffledSubarray(keys, { minLength: keys.length });
  return fc.tuple(moves, orders).map(([wanted, order]) => {
    let values = parameters.defaults as Values;
    for (const key of [...order, ...order]) {
      const field = (parameters.fields as Record<string, Field>)[key]!;
      for (const move of smallerMoves(field, wanted[key]!)) {
        const tried = { ...values, [key]: valueAt(field, move) };
        if (!parameters.schema.safeParse(tried).success) continue;
        values = tried;
        break;
      }
    }
    return parameters.schema.parse(values);
  });
}

function expectVolumes(
  bodies: readonly BuiltBody[],
  expected: Readonly<Record<string, number>>,
  within: number,
) {
  expect(bodies.map((body) => body.name).sort()).toEqual(Object.keys(expected).sort());
  for (const { name, volume } of bodies) {
    const error = Math.abs(volume / expected[name]! - 1);
    expect(error, `${name}: ${volume} mm3 built, ${expected[name]} mm3 expected`).toBeLessThanOrEqual(within);
  }
}

export interface SolidChecks {
  readonly runs: number;
  readonly seed: number;
  /** largest relative error of a body's volume against the closed form; 1e-3 where not given */
  readonly volumeError?: number;
  /** further expectations on the bodies of one draw */
  readonly also?: (values: unknown, bodies: readonly BuiltBody[], quality: QualityName) => void;
}

/**
 * Builds a family at random valid values (one in ten at export quality) and expects closed meshes, finite bounds of
 * some size on each axis, and the family's closed-form volumes where it has any.
 */
export async function checkFamilySolids(
  family: Family,
  { runs, seed, volumeError = 1e-3, also }: SolidChecks,
): Promise<void> {
  const host = await createKernelHost();
  const quality = fc.oneof(
    { weight: 9, arbitrary: fc.constant<QualityName>('preview') },
    { weight: 1, arbitrary: fc.constant<QualityName>('export') },
  );
  const draw = fc.property(arbitraryParameters(family.parameters), quality, (values, name) => {
    const bodies = host.build((kernel) => family.build(values, kernel), QUALITY[name]);
    for (const { name: body, mesh, bounds } of bodies) {
      expect(meshFaults(mesh), body).toEqual([]);
      expect(bounds.every(Number.isFinite), body).toBe(true);
      expect(Math.min(bounds[3] - bounds[0], bounds[4] - bounds[1], bounds[5] - bounds[2])).toBeGreaterThan(
        0,
      );
    }
    const expected = family.volumes(values, QUALITY[name].segmentsPerTurn);
    if (expected) expectVolumes(bodies, expected, volumeError);
    also?.(values, bodies, name);
  });
  fc.assert(draw, { numRuns: runs, seed, includeErrorInReport: true });
}
