import { describeFamilies } from '@/lib/access/families';
import { route } from '@/lib/http/route';
import { openApiDocument } from '@/lib/http/v1/openapi';

export const GET = route({
  rateLimit: 'reads',
  handler: async () => openApiDocument(await describeFamilies()),
});
export { takesGet as DELETE, takesGet as PATCH, takesGet as POST, takesGet as PUT } from '@/lib/http/methods';
