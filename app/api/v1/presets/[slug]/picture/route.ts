import { presetPicture } from '@/lib/access/presets';
import { route } from '@/lib/http/route';
import { readVersion, slugParams } from '@/lib/http/v1/library-words';
import { pictureResponse } from '@/lib/http/v1/picture-response';

export const GET = route({
  rateLimit: 'pictures',
  schemas: { params: slugParams },
  handler: async ({ request, params, query }) => {
    const number = readVersion(new URLSearchParams(query).get('version') ?? undefined);
    return pictureResponse(request, await presetPicture(params.slug, number), 'public');
  },
});
export { takesGet as DELETE, takesGet as PATCH, takesGet as POST, takesGet as PUT } from '@/lib/http/methods';
