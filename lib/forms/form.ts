import 'server-only';
import { headers } from 'next/headers';
import type { z } from 'zod';
import { currentViewer } from '@/lib/auth/session';
import type { Client } from '@/lib/auth/sign-in';
import type { Viewer } from '@/lib/auth/viewer';
import {
  Conflict,
  InvalidInput,
  NotAllowed,
  NotFound,
  SignInNeeded,
  TooMany,
  Unavailable,
} from '@/lib/errors';
import { log } from '@/lib/http/log';
import { clientOf } from '@/lib/http/rate-limit';
import { fromOwnPage } from '@/lib/http/same-origin';
import { errorsOf, isOversize, valuesOf, withoutSecrets } from './read-form';
import type { FormAction, FormState } from './state';

export interface FormCall {
  readonly viewer: Viewer;
  readonly client: Client;
}

interface FormSpec<S extends z.ZodObject> {
  readonly schema: S;
  /** fields never sent back to the page */
  readonly secrets?: readonly (keyof z.infer<S> & string)[];
  /** Does it; the text answered is shown as done. It may redirect. */
  readonly run: (input: z.infer<S>, call: FormCall) => Promise<string | undefined>;
}

const TOLD = [Conflict, NotAllowed, NotFound, SignInNeeded, TooMany, Unavailable] as const;

const isRedirect = (error: unknown): boolean =>
  typeof error === 'object' &&
  error !== null &&
  'digest' in error &&
  String(error.digest).startsWith('NEXT_');

type Outcome = Pick<FormState, 'errors' | 'notice'>;

const refused = (text: string): Outcome => ({ errors: {}, notice: { kind: 'refused', text } });

function failure(error: unknown): Outcome {
  if (isRedirect(error)) throw error;
  if (error instanceof InvalidInput) {
    const issues = error.issues.map(({ field, message }) => ({ path: field.split('.'), message }));
    return { errors: errorsOf(issues), notice: null };
  }
  if (TOLD.some((kind) => error instanceof kind)) return refused(`${(error as Error).message}.`);
  log().error({ err: error }, 'form failed');
  return refused('Something went wrong on our side. Nothing was changed.');
}

async function outcomeOf<S extends z.ZodObject>(spec: FormSpec<S>, data: FormData): Promise<Outcome> {
  const head = await headers();
  if (!fromOwnPage(head))
    return refused('This form was sent from another site. Open the page here and try again.');
  if (isOversize(data)) return refused('That is more than this form takes.');
  const parsed = spec.schema.safeParse(valuesOf(spec.schema, data));
  if (!parsed.success) return { errors: errorsOf(parsed.error.issues), notice: null };
  const client = { address: clientOf({ headers: head }), userAgent: head.get('user-agent') ?? '' };
  try {
    const done = await spec.run(parsed.data, { viewer: await currentViewer(), client });
    return { errors: {}, notice: done === undefined ? null : { kind: 'done', text: done } };
  } catch (error) {
    return failure(error);
  }
}

/** Makes the server action of a form: origin, limits, every field error, what was typed without the secrets. */
export function formAction<S extends z.ZodObject>(spec: FormSpec<S>): FormAction {
  return async (previous, data) => {
    const outcome = await outcomeOf(spec, data);
    const failed = outcome.notice?.kind !== 'done';
    const values = failed ? withoutSecrets(valuesOf(spec.schema, data), spec.secrets ?? []) : {};
    return { ...outcome, values, sent: (Number(previous?.sent) || 0) + 1 };
  };
}
