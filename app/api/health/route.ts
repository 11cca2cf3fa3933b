import { health } from '@/lib/access/health';
import { route } from '@/lib/http/route';

export const GET = route({ rateLimit: 'reads', handler: () => health() });
