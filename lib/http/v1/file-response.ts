import type { ExportedFile } from '@/lib/access/export';

export const matches = (header: string | null, etag: string): boolean =>
  (header ?? '').split(',').some((tag) => tag.trim() === '*' || tag.trim().replace(/^W\//, '') === etag);

/** A file to save, or "not modified" for a client that has it already. */
export function fileResponse(request: Request, file: ExportedFile): Response {
  const headers = { ETag: file.etag, 'Cache-Control': 'no-cache' };
  if (request.method === 'GET' && matches(request.headers.get('if-none-match'), file.etag)) {
    return new Response(null, { status: 304, headers });
  }
  return new Response(file.bytes, {
    headers: {
      ...headers,
      'Content-Type': file.mediaType,
      'Content-Length': String(file.bytes.byteLength),
      'Content-Disposition': `attachment; filename="${file.fileName}"`,
    },
  });
}
