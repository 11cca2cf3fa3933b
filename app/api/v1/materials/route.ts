import { listMaterials } from '@/lib/access/materials';
import { route } from '@/lib/http/route';

export const GET = route({ rateLimit: 'reads', handler: () => ({ materials: listMaterials() }) });
export { takesGet as DELETE, takesGet as PATCH, takesGet as POST, takesGet as PUT } from '@/lib/http/methods';
