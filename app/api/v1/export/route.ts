import { exportDesign, exportLink } from '@/lib/access/export';
import { route } from '@/lib/http/route';
import { readExportLink } from '@/lib/http/v1/export-link';
import { fileResponse } from '@/lib/http/v1/file-response';
import { exportRequest } from '@/lib/http/v1/requests';

export const GET = route({
  rateLimit: 'exports',
  handler: async ({ request, query }) => {
    const { wish, entries } = readExportLink(query);
    return fileResponse(request, await exportLink(wish, entries));
  },
});

export const POST = route({
  rateLimit: 'exports',
  schemas: { body: exportRequest },
  handler: async ({ request, body }) => fileResponse(request, await exportDesign(body)),
});

export {
  takesGetAndPost as DELETE,
  takesGetAndPost as PATCH,
  takesGetAndPost as PUT,
} from '@/lib/http/methods';
