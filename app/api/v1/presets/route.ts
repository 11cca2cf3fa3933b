import { searchLibrary } from '@/lib/access/library';
import { route } from '@/lib/http/route';
import { readLibraryWords } from '@/lib/http/v1/library-words';

export const GET = route({
  auth: true,
  rateLimit: 'reads',
  handler: ({ viewer, query }) => searchLibrary(viewer, readLibraryWords(new URLSearchParams(query))),
});
export { takesGet as DELETE, takesGet as PATCH, takesGet as POST, takesGet as PUT } from '@/lib/http/methods';
