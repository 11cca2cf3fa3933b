import { copyDesign } from '@/lib/access/designs';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/http/v1/requests';

export const POST = route({
  auth: true,
  rateLimit: 'writes',
  schemas: { params: idParams },
  handler: ({ viewer, params }) => Response.json(copyDesign(viewer, params.id), { status: 201 }),
});
export {
  takesPost as DELETE,
  takesPost as GET,
  takesPost as PATCH,
  takesPost as PUT,
} from '@/lib/http/methods';
