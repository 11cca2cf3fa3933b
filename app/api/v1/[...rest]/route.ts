import { NotFound } from '@/lib/errors';
import { route } from '@/lib/http/route';

const nowhere = route({
  rateLimit: 'reads',
  handler: ({ request }) => {
    throw new NotFound(`The address ${new URL(request.url).pathname.slice(0, 200)}`);
  },
});

export { nowhere as DELETE, nowhere as GET, nowhere as PATCH, nowhere as POST, nowhere as PUT };
