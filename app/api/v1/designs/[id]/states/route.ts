import { listStates } from '@/lib/access/designs';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/http/v1/requests';

export const GET = route({
  auth: true,
  rateLimit: 'reads',
  schemas: { params: idParams },
  handler: ({ viewer, params }) => ({ states: listStates(viewer, params.id) }),
});
export { takesGet as DELETE, takesGet as PATCH, takesGet as POST, takesGet as PUT } from '@/lib/http/methods';
