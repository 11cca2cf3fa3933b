import type { z } from 'zod';
import type { FieldIssue } from '@/lib/errors';
import type { Unit } from '@/lib/units';

type Issue = z.core.$ZodIssue;

const fieldOf = (path: readonly PropertyKey[], fallback: string) =>
  path.length > 0 ? path.map(String).join('.') : fallback;

function boundOf(issue: Issue): number | undefined {
  if (issue.code === 'too_big') return Number(issue.maximum);
  return issue.code === 'too_small' ? Number(issue.minimum) : undefined;
}

const wrongKind = (issues: readonly Issue[]) =>
  issues.some((issue) => issue.code === 'invalid_type' && issue.path.length === 0);

/** The branch of a union that the input was meant for: the one whose kind it has. */
const meant = (branches: readonly (readonly Issue[])[]) => branches.find((issues) => !wrongKind(issues));

/** Units of the numbers of a request, by the path of the field. */
export type FieldUnits = Readonly<Record<string, Unit>>;

interface Within {
  readonly path: readonly PropertyKey[];
  /** name of the input itself */
  readonly whole: string;
  readonly units: FieldUnits;
}

function flatten(issue: Issue, within: Within): FieldIssue[] {
  const path = [...within.path, ...issue.path];
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({
      field: fieldOf([...path, key], key),
      message: `${key} is not known here`,
    }));
  }
  const branch = issue.code === 'invalid_union' && meant(issue.errors);
  if (branch) return branch.flatMap((one) => flatten(one, { ...within, path }));
  const bound = boundOf(issue);
  const field = fieldOf(path, within.whole);
  const unit = within.units[field];
  return [{ field, message: issue.message, ...(bound !== undefined && { bound }), ...(unit && { unit }) }];
}

/** Every field at fault, by its path in the request. */
export const issuesOf = (error: z.ZodError, whole: string, units: FieldUnits = {}): FieldIssue[] =>
  error.issues.flatMap((issue) => flatten(issue, { path: [], whole, units }));
