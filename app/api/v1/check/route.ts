import { checkDesign } from '@/lib/access/check';
import { route } from '@/lib/http/route';
import { CHECK_UNITS, checkRequest } from '@/lib/http/v1/requests';

export const POST = route({
  rateLimit: 'checks',
  schemas: { body: checkRequest, units: CHECK_UNITS },
  handler: ({ body }) => checkDesign(body),
});
export {
  takesPost as DELETE,
  takesPost as GET,
  takesPost as PATCH,
  takesPost as PUT,
} from '@/lib/http/methods';
