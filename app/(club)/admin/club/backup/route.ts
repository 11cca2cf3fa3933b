import { backupDatabase } from '@/lib/access/backup';
import { currentViewer } from '@/lib/auth/session';
import { route } from '@/lib/http/route';

export const POST = route({
  rateLimit: 'exports',
  async handler() {
    const { name, size, content } = await backupDatabase(await currentViewer());
    return new Response(content, {
      headers: {
        'Content-Type': 'application/vnd.sqlite3',
        'Content-Disposition': `attachment; filename="${name}"`,
        'Content-Length': String(size),
      },
    });
  },
});
export {
  takesPost as DELETE,
  takesPost as GET,
  takesPost as PATCH,
  takesPost as PUT,
} from '@/lib/http/methods';
