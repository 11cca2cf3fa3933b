import { reviewPicture } from '@/lib/access/review';
import { route } from '@/lib/http/route';
import { pictureResponse } from '@/lib/http/v1/picture-response';
import { idParams } from '@/lib/http/v1/requests';

export const GET = route({
  auth: true,
  rateLimit: 'pictures',
  schemas: { params: idParams },
  handler: async ({ request, viewer, params }) =>
    pictureResponse(request, await reviewPicture(viewer, params.id), 'private'),
});
export { takesGet as DELETE, takesGet as PATCH, takesGet as POST, takesGet as PUT } from '@/lib/http/methods';
