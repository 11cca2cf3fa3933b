import { photoFile, removePhoto } from '@/lib/access/photos';
import { takesOnly } from '@/lib/http/methods';
import { route } from '@/lib/http/route';
import { pictureResponse } from '@/lib/http/v1/picture-response';
import { idParams } from '@/lib/http/v1/requests';

export const GET = route({
  auth: true,
  rateLimit: 'pictures',
  schemas: { params: idParams },
  handler: async ({ request, viewer, params }) => {
    const photo = await photoFile(viewer, params.id);
    return pictureResponse(request, photo, photo.open ? 'public' : 'private');
  },
});

export const DELETE = route({
  auth: true,
  rateLimit: 'writes',
  schemas: { params: idParams },
  handler: async ({ viewer, params }) => {
    await removePhoto(viewer, params.id);
    return new Response(null, { status: 204 });
  },
});

const other = takesOnly('GET, DELETE');

export { other as PATCH, other as POST, other as PUT };
