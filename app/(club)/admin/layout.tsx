import type { ReactNode } from 'react';
import { AdminNav } from '@/components/club/admin-nav';
import { may } from '@/lib/access/policy';
import { currentViewer } from '@/lib/auth/session';

/** Who gets in is decided by each page; this only leaves its links away from others. */
export default async function AdminLayout({ children }: { children: ReactNode }) {
  const shown = may(await currentViewer(), 'members.manage');
  return (
    <div className="frame flex-1 pt-6 pb-16">
      {shown && <AdminNav />}
      {children}
    </div>
  );
}
