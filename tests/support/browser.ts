import type { FormAction, FormState } from '@/lib/forms/state';
import { request } from './next-headers';

export const SITE = 'http://127.0.0.1:3000';

type Head = Readonly<Record<string, string>>;

/** What a browser says of a request made by a page of the site itself. */
export const OWN_PAGE: Head = {
  host: new URL(SITE).host,
  origin: SITE,
  'sec-fetch-site': 'same-origin',
  'user-agent': 'Mozilla/5.0 (X11; Linux x86_64) Chrome/147.0.0.0',
};

export type Answer = Partial<FormState> & { readonly goesTo?: string };

type Fields = Readonly<Record<string, string | readonly string[]>>;

export function formOf(fields: Fields): FormData {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) {
    for (const one of [value].flat()) form.append(name, one);
  }
  return form;
}

const digestOf = (error: unknown): string => String((error as { digest?: unknown })?.digest ?? '');

/** Where a redirect leads; undefined for any other error. */
export function redirectOf(error: unknown): string | undefined {
  const digest = digestOf(error);
  return digest.startsWith('NEXT_REDIRECT') ? digest.split(';')[2] : undefined;
}

export const isNotFound = (error: unknown): boolean => digestOf(error) === 'NEXT_HTTP_ERROR_FALLBACK;404';

/** Somebody's browser: keeps its cookies from one request to the next. */
export class Browser {
  readonly jar = new Map<string, string>();

  constructor(readonly address = '192.0.2.1') {}

  /** Does something as part of a request of this browser. */
  async within<T>(work: () => T | Promise<T>, head: Head = OWN_PAGE): Promise<T> {
    const cookie = [...this.jar].map(([name, value]) => `${name}=${value}`).join('; ');
    request.jar = this.jar;
    request.head = new Headers({ ...head, 'x-forwarded-for': this.address, ...(cookie && { cookie }) });
    return work();
  }

  /** Sends a form; answers what the page would show, or where it goes. */
  async submit(action: FormAction, fields: Fields, head?: Head): Promise<Answer> {
    const empty: FormState = { errors: {}, notice: null, values: {}, sent: 0 };
    try {
      return await this.within(() => action(empty, formOf(fields)), head);
    } catch (error) {
      const goesTo = redirectOf(error);
      if (goesTo === undefined) throw error;
      return { goesTo };
    }
  }
}
