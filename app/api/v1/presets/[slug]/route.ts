import { getPreset } from '@/lib/access/presets';
import { route } from '@/lib/http/route';
import { readVersion, slugParams } from '@/lib/http/v1/library-words';

export const GET = route({
  auth: true,
  rateLimit: 'reads',
  schemas: { params: slugParams },
  handler: ({ viewer, params, query }) =>
    getPreset(viewer, params.slug, readVersion(new URLSearchParams(query).get('version') ?? undefined)),
});
export { takesGet as DELETE, takesGet as PATCH, takesGet as POST, takesGet as PUT } from '@/lib/http/methods';
