import { health } from '@/lib/access/health';
import { route } from '@/lib/http/route';

export const GET = route({ rateLimit: 'reads', handler: () => health() });
export { takesGet as DELETE, takesGet as PATCH, takesGet as POST, takesGet as PUT } from '@/lib/http/methods';
