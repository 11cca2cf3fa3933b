import { describeFamily } from '@/lib/access/families';
import { route } from '@/lib/http/route';
import { idParams } from '@/lib/http/v1/requests';

export const GET = route({
  rateLimit: 'reads',
  schemas: { params: idParams },
  handler: ({ params }) => describeFamily(params.id),
});
export { takesGet as DELETE, takesGet as PATCH, takesGet as POST, takesGet as PUT } from '@/lib/http/methods';
