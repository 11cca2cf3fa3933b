import { restoreState } from '@/lib/access/designs';
import { route } from '@/lib/http/route';
import { restoreRequest, stateParams } from '@/lib/http/v1/design-requests';

export const POST = route({
  auth: true,
  rateLimit: 'writes',
  schemas: { params: stateParams, body: restoreRequest },
  handler: ({ viewer, params, body }) =>
    restoreState(viewer, params.id, { state: params.state, revision: body.revision }),
});
export {
  takesPost as DELETE,
  takesPost as GET,
  takesPost as PATCH,
  takesPost as PUT,
} from '@/lib/http/methods';
