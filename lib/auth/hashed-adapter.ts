import 'server-only';
import type { Adapter, DatabaseSession } from 'lucia';
import { digest } from './secret';

/** Hands every session id to the database as its SHA-256, so that no stored row can be used as a cookie. */
export function hashedAdapter(inner: Adapter): Adapter {
  return {
    async getSessionAndUser(id) {
      const [session, user] = await inner.getSessionAndUser(digest(id));
      return [session && { ...session, id }, user];
    },
    getUserSessions: (userId) => inner.getUserSessions(userId),
    setSession: (session: DatabaseSession) => inner.setSession({ ...session, id: digest(session.id) }),
    updateSessionExpiration: (id, expiresAt) => inner.updateSessionExpiration(digest(id), expiresAt),
    deleteSession: (id) => inner.deleteSession(digest(id)),
    deleteUserSessions: (userId) => inner.deleteUserSessions(userId),
    deleteExpiredSessions: () => inner.deleteExpiredSessions(),
  };
}
