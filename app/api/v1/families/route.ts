import { describeFamilies } from '@/lib/access/families';
import { route } from '@/lib/http/route';

export const GET = route({
  rateLimit: 'reads',
  handler: async () => ({ families: await describeFamilies() }),
});
export { takesGet as DELETE, takesGet as PATCH, takesGet as POST, takesGet as PUT } from '@/lib/http/methods';
