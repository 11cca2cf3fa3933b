import { describeFamily } from '@/lib/access/families';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/http/v1/requests';

export const GET = route({
  rateLimit: 'reads',
  schemas: { params: idParams },
  handler: ({ params }) => describeFamily(params.id),
});
