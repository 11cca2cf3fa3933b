import { setFavourite } from '@/lib/access/presets';
import { takesOnly } from '@/lib/http/methods';
import { route } from '@/lib/http/route';
import { slugParams } from '@/lib/http/v1/library-words';

const set = (wanted: boolean) =>
  route({
    auth: true,
    rateLimit: 'writes',
    schemas: { params: slugParams },
    handler: ({ viewer, params }) => {
      setFavourite(viewer, params.slug, wanted);
      return new Response(null, { status: 204 });
    },
  });

export const PUT = set(true);
export const DELETE = set(false);

const other = takesOnly('PUT, DELETE');

export { other as GET, other as PATCH, other as POST };
