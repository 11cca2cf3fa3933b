/** What a form knows after it was sent. */
export interface FormState {
  /** by field, each with what is wrong with it */
  readonly errors: Readonly<Record<string, string>>;
  readonly notice: { readonly kind: 'done' | 'refused'; readonly text: string } | null;
  /** what was typed, without secrets */
  readonly values: Readonly<Record<string, string | readonly string[]>>;
  /** counts the sendings, so that the same answer twice is told twice */
  readonly sent: number;
}

export const EMPTY_FORM: FormState = { errors: {}, notice: null, values: {}, sent: 0 };

export type FormAction = (previous: FormState, data: FormData) => Promise<FormState>;
