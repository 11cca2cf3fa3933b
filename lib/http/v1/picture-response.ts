import type { Picture } from '@/lib/access/pictures';
import { matches } from './file-response';

/** A WebP picture, or "not modified" for a client that has it. Asked again each time: the address stays, the part changes. */
export function pictureResponse(request: Request, picture: Picture, who: 'private' | 'public'): Response {
  const headers = { ETag: picture.etag, 'Cache-Control': `${who}, no-cache` };
  if (matches(request.headers.get('if-none-match'), picture.etag)) {
    return new Response(null, { status: 304, headers });
  }
  return new Response(picture.bytes, {
    headers: {
      ...headers,
      'Content-Type': 'image/webp',
      'Content-Length': String(picture.bytes.byteLength),
      'Content-Disposition': 'inline',
    },
  });
}
