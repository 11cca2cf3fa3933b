import { env } from '@/lib/env';

type Head = Pick<Headers, 'get'>;

/** Whether an origin is this site's: the configured one, or without one whatever host was asked for. */
function isOwn(origin: string, head: Head): boolean {
  const { PUBLIC_URL } = env();
  if (PUBLIC_URL !== undefined) return origin === PUBLIC_URL;
  return URL.canParse(origin) && new URL(origin).host === head.get('host');
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
  return origin === null || isOwn(origin, head);
}
