import { describeFamilies } from '@/lib/access/families';
import { route } from '@/lib/http/route';

export const GET = route({
  rateLimit: 'reads',
  handler: async () => ({ families: await describeFamilies() }),
});
