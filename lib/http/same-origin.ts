import { env, publicUrl } from '@/lib/env';

type Head = Pick<Headers, 'get'>;

/** Where this site is reached: as configured, else at whatever host was asked for. */
const ownHost = (head: Head): string =>
  env().PUBLIC_URL ? new URL(publicUrl()).host : (head.get('host') ?? '');

function hostOf(origin: string): string | null {
  return URL.canParse(origin) ? new URL(origin).host : null;
}

/**
 * Whether a request that changes something was made by a page of this site. Browsers say so in Sec-Fetch-Site and
 * Origin; a request that says neither is none of theirs, and may only be one that brings no cookie to misuse.
 */
export function fromOwnPage(head: Head): boolean {
  const site = head.get('sec-fetch-site');
  const origin = head.get('origin');
  if (site === null && origin === null) return head.get('cookie') === null;
  if (site !== null && site !== 'same-origin' && site !== 'none') return false;
  return origin === null || hostOf(origin) === ownHost(head);
}
