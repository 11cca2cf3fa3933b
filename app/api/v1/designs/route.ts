import { createDesign, listDesigns } from '@/lib/access/designs';
import { takesOnly } from '@/lib/http/methods';
import { route } from '@/lib/http/route';
import { designFilter, readDesignWords } from '@/lib/http/v1/design-filter';
import { newDesignRequest } from '@/lib/http/v1/design-requests';

export const GET = route({
  auth: true,
  rateLimit: 'reads',
  handler: ({ viewer, query }) =>
    listDesigns(viewer, designFilter(readDesignWords(new URLSearchParams(query)))),
});

export const POST = route({
  auth: true,
  rateLimit: 'writes',
  schemas: { body: newDesignRequest },
  handler: async ({ viewer, body }) => Response.json(await createDesign(viewer, body), { status: 201 }),
});

const other = takesOnly('GET, POST');

export { other as DELETE, other as PATCH, other as PUT };
