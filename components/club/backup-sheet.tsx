import { Download } from 'lucide-react';
import { Button } from '@/components/ui/button';
import { Sheet, SheetTitle } from '@/components/ui/sheet';

export const BackupSheet = () => (
  <Sheet labelledBy="backup" className="grid gap-4 p-5">
    <SheetTitle id="backup">Backup</SheetTitle>
    <p>
      One file with everything: members, designs, library, audit trail. It is whole even while others work.
      Keep it where only you can read it; it holds every address, and passwords as hashes.
    </p>
    <form action="/admin/club/backup" method="post">
      <Button type="submit" look="ink">
        <Download aria-hidden="true" size={18} />
        Download a backup
      </Button>
    </form>
    <p className="text-muted text-sm">
      To restore: stop the server, run <code className="font-mono">npm run db:restore -- file</code>, start it
      again. The database that was there is kept beside it.
    </p>
  </Sheet>
);
