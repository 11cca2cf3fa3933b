import { listMaterials } from '@/lib/access/materials';
import { route } from '@/lib/http/route';

export const GET = route({ rateLimit: 'reads', handler: () => ({ materials: listMaterials() }) });
