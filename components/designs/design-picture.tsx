import type { Row } from './design-table';

/** The part as drawn on the server; a deleted one has no picture to ask for. */
export function DesignPicture({ row, deleted }: { row: Row; deleted: boolean }) {
  if (deleted)
    return <span aria-hidden="true" className="hatched block aspect-4/3 w-full max-w-28 rounded-field" />;
  return (
    // biome-ignore lint/performance/noImgElement: drawn on the server at the size it is shown
    <img
      src={`/api/v1/designs/${row.id}/picture?r=${row.revision}`}
      alt=""
      width={400}
      height={300}
      loading="lazy"
      decoding="async"
      className="h-auto w-full max-w-28 rounded-field bg-[color-mix(in_oklab,var(--sheet),var(--edge)_18%)]"
    />
  );
}
