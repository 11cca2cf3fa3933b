import { InvalidInput, NotFound } from '@/lib/errors';
import type { KernelHost } from '@/lib/geometry/host';
import { type BuiltBody, type NamedSolid, QUALITY, type QualityName } from '@/lib/geometry/kernel';
import type { Family, Stance } from './contract';
import { laySolidsOnBed } from './lay-on-bed';
import { parseParameters } from './parameters';

export interface PartRequest {
  /** values of the family's parameters; those left out take the defaults */
  readonly parameters: unknown;
  readonly quality: QualityName;
  /** names of the bodies wanted, in any order; all where left out */
  readonly bodies?: readonly string[] | undefined;
}

function pick(solids: readonly NamedSolid[], wanted: readonly string[] | undefined): readonly NamedSolid[] {
  if (!wanted) return solids;
  const names = solids.map((solid) => solid.name);
  const unknown = wanted.filter((name) => !names.includes(name));
  if (wanted.length === 0 || unknown.length > 0) {
    const message = `bodies must be among ${names.join(', ')}`;
    throw new InvalidInput([{ field: 'bodies', message, received: wanted }]);
  }
  return solids.filter((solid) => wanted.includes(solid.name));
}

function valuesOf(family: Family, parameters: unknown): unknown {
  const parsed = parseParameters(family.parameters, parameters);
  if (!parsed.ok) throw new InvalidInput(parsed.issues);
  return parsed.values;
}

/** The bodies of a part where they were designed, two-body families assembled. */
export function buildPart(host: KernelHost, family: Family, request: PartRequest): BuiltBody[] {
  const values = valuesOf(family, request.parameters);
  return host.build((kernel) => pick(family.build(values, kernel), request.bodies), QUALITY[request.quality]);
}

function stanceOf(family: Family, values: unknown, id: string | undefined): Stance {
  const stances = family.stances(values);
  const stance = id === undefined ? stances[0] : stances.find((one) => one.id === id);
  if (!stance) throw new NotFound(`stance ${id ?? ''} of ${family.about.id}`);
  return stance;
}

/** The bodies of a part laid on the bed: in the named stance, or the family's best where none is named. */
export function buildPartOnBed(
  host: KernelHost,
  family: Family,
  request: PartRequest & { readonly stance?: string | undefined },
): BuiltBody[] {
  const values = valuesOf(family, request.parameters);
  const stance = stanceOf(family, values, request.stance);
  return host.build(
    (kernel) => laySolidsOnBed(kernel, pick(family.build(values, kernel), request.bodies), stance),
    QUALITY[request.quality],
  );
}
