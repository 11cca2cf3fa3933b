import { Drawing } from '@/components/library/drawing';
import type { Row } from './design-table';

/** The part as drawn on the server; a deleted one has no picture to ask for. */
export function DesignPicture({ row, deleted }: { row: Row; deleted: boolean }) {
  if (deleted)
    return <span aria-hidden="true" className="hatched block aspect-4/3 w-full max-w-28 rounded-field" />;
  return (
    <Drawing
      src={`/api/v1/designs/${row.id}/picture?r=${row.revision}`}
      alt=""
      className="max-w-28 rounded-field"
    />
  );
}
