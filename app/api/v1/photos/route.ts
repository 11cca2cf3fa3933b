import { uploadPhoto } from '@/lib/access/photos';
import { readBytes } from '@/lib/http/read-json';
import { route } from '@/lib/http/route';
import { MOST_PHOTO_BYTES } from '@/lib/storage/images';

/** The body is the photo itself; what it says of its type is not looked at. */
export const POST = route({
  auth: true,
  rateLimit: 'uploads',
  handler: async ({ request, viewer }) => {
    const bytes = viewer === null ? new Uint8Array() : await readBytes(request, MOST_PHOTO_BYTES);
    return Response.json(await uploadPhoto(viewer, bytes), { status: 201 });
  },
});
export {
  takesPost as DELETE,
  takesPost as GET,
  takesPost as PATCH,
  takesPost as PUT,
} from '@/lib/http/methods';
