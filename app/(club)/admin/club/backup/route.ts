import { backupDatabase } from '@/lib/access/backup';
import { route } from '@/lib/http/route';

export const POST = route({
  auth: true,
  rateLimit: 'exports',
  async handler({ viewer }) {
    const { name, size, content } = await backupDatabase(viewer);
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
