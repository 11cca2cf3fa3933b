/** What the server answered to a change: its value, or why it was refused, in words for people. */
export type Sent<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly status: number; readonly message: string };

const UNREACHED = 'The server cannot be reached';

interface ProblemText {
  readonly detail?: string;
  readonly title?: string;
}

/** Sends a change to the API and reads its answer; never throws. `leaving` keeps it going while the page closes. */
export async function send<T>(
  method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE',
  address: string,
  body?: unknown,
  { leaving = false } = {},
): Promise<Sent<T>> {
  try {
    const response = await fetch(address, {
      method,
      keepalive: leaving,
      ...(body !== undefined && {
        headers: { 'Content-Type': 'application/json' },
        body: JSON.stringify(body),
      }),
    });
    const answer: unknown = response.status === 204 ? null : await response.json().catch(() => null);
    if (response.ok) return { ok: true, value: answer as T };
    const { detail, title } = (answer ?? {}) as ProblemText;
    return { ok: false, status: response.status, message: detail ?? title ?? UNREACHED };
  } catch {
    return { ok: false, status: 0, message: `${UNREACHED}.` };
  }
}
