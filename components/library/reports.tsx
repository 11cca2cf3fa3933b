import { CircleCheck, CircleX } from 'lucide-react';
import { When } from '@/components/designs/when';
import type { PresetReport } from '@/lib/access/presets';

function Line({ report }: { report: PresetReport }) {
  const { worked, by, printer, material, note, version, createdAt, mine } = report;
  const Icon = worked ? CircleCheck : CircleX;
  return (
    <li className="grid grid-cols-[1.75rem_1fr] gap-x-2 border-hair border-t py-3">
      <Icon aria-hidden="true" size={20} className={worked ? 'mt-0.5 text-ok' : 'mt-0.5 text-over'} />
      <div>
        <p>
          <b className="font-semibold">{worked ? 'Worked' : 'Did not work'}</b> for {mine ? 'you' : by},{' '}
          {material} on {printer}
        </p>
        {note && <p className="mt-0.5 max-w-prose">{note}</p>}
        <p className="mt-0.5 text-muted text-sm">
          Version {version}, <When iso={createdAt} />
        </p>
      </div>
    </li>
  );
}

/** What others found, newest first. */
export function Reports({ reports }: { reports: readonly PresetReport[] }) {
  if (reports.length === 0) return <p className="mt-2 text-muted">Nobody has told yet how it went.</p>;
  return (
    <ul className="mt-2">
      {reports.map((report) => (
        <Line key={report.id} report={report} />
      ))}
    </ul>
  );
}
