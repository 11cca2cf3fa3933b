import { deleteDesign, getDesign, renameDesign, saveDesign } from '@/lib/access/designs';
import { takesOnly } from '@/lib/http/methods';
import { route } from '@/lib/http/route';
import { renameRequest, saveDesignRequest } from '@/lib/http/v1/design-requests';
import { idParams } from '@/lib/http/v1/requests';

export const GET = route({
  auth: true,
  rateLimit: 'reads',
  schemas: { params: idParams },
  handler: ({ viewer, params }) => getDesign(viewer, params.id),
});

export const PUT = route({
  auth: true,
  rateLimit: 'writes',
  schemas: { params: idParams, body: saveDesignRequest },
  handler: ({ viewer, params, body }) => saveDesign(viewer, params.id, body),
});

export const PATCH = route({
  auth: true,
  rateLimit: 'writes',
  schemas: { params: idParams, body: renameRequest },
  handler: ({ viewer, params, body }) => renameDesign(viewer, params.id, body.name),
});

export const DELETE = route({
  auth: true,
  rateLimit: 'writes',
  schemas: { params: idParams },
  handler: ({ viewer, params }) => {
    deleteDesign(viewer, params.id);
    return new Response(null, { status: 204 });
  },
});

const other = takesOnly('GET, PUT, PATCH, DELETE');

export { other as POST };
