import { describeFamilies } from '@/lib/access/families';
import { route } from '@/lib/http/route';
import { openApiDocument } from '@/lib/http/v1/openapi';

export const GET = route({
  rateLimit: 'reads',
  handler: async () => openApiDocument(await describeFamilies()),
});
