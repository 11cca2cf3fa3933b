'use client';
import type { DrawnDimension } from '../drawing/dimensions';

export interface Pin {
  readonly x: number;
  readonly y: number;
  readonly text: string;
  /** false where the part itself stands before the place: drawn in dashes, as hidden lines are */
  readonly seen: boolean;
}

export interface OverlayContent {
  readonly dimensions: readonly DrawnDimension[];
  readonly pin: Pin | null;
  /** the place of largest strain is in the part that was cut away */
  readonly cutAway: boolean;
}

/** Dimension lines and the mark of the peak, over whichever picture is shown. */
export function Overlay({ dimensions, pin }: Omit<OverlayContent, 'cutAway'>) {
  return (
    <svg aria-hidden="true" className="pointer-events-none absolute inset-0 h-full w-full overflow-hidden">
      {dimensions.map((dimension) => (
        <Dimension key={dimension.field + dimension.text} dimension={dimension} />
      ))}
      {pin && <PeakPin pin={pin} />}
    </svg>
  );
}

function Dimension({ dimension }: { dimension: DrawnDimension }) {
  const { label, emphasised } = dimension;
  const weight = emphasised ? 2 : 1;
  return (
    <g stroke="var(--ink)" fill="none" strokeWidth={weight} data-dimension={dimension.field}>
      {dimension.extensions.map((line) => (
        <line key={`${line.x1} ${line.y1}`} {...line} strokeWidth={0.8} opacity={0.7} />
      ))}
      <path d={dimension.line} stroke="var(--sheet)" strokeWidth={weight + 3} opacity={0.6} />
      <path d={dimension.line} />
      {dimension.arrows.map((arrow) => (
        <path
          key={arrow}
          d={arrow}
          fill="var(--ink)"
          stroke="var(--sheet)"
          strokeWidth={1.5}
          paintOrder="stroke"
        />
      ))}
      <rect
        x={label.x - label.width / 2}
        y={label.y - label.height / 2}
        width={label.width}
        height={label.height}
        rx={2}
        stroke="none"
        fill={emphasised ? 'var(--marker)' : 'var(--sheet)'}
        opacity={emphasised ? 1 : 0.82}
      />
      <text
        x={label.x}
        y={label.y}
        textAnchor="middle"
        dominantBaseline="central"
        stroke="none"
        fill={emphasised ? '#0f2a2e' : 'var(--ink)'}
        className="font-mono text-[12px] tabular-nums"
        fontWeight={emphasised ? 600 : 400}
      >
        {dimension.text}
      </text>
    </g>
  );
}

function PeakPin({ pin: { x, y, text, seen } }: { pin: Pin }) {
  const width = text.length * 6.9 + 14;
  const left = x > 240;
  const end = left ? x - 26 : x + 26;
  return (
    <g data-peak={seen ? 'seen' : 'behind'}>
      <circle
        cx={x}
        cy={y}
        r={5}
        fill="none"
        stroke="var(--ink)"
        strokeWidth={1.6}
        strokeDasharray={seen ? undefined : '3 2.2'}
      />
      {seen && <circle cx={x} cy={y} r={1.6} fill="var(--ink)" />}
      <path d={`M${left ? x - 5 : x + 5} ${y - 3}L${end} ${y - 22}`} stroke="var(--ink)" fill="none" />
      <rect x={left ? end - width : end} y={y - 33} width={width} height={21} rx={2} fill="var(--ink)" />
      <text
        x={end + (left ? -width : width) / 2}
        y={y - 22}
        textAnchor="middle"
        dominantBaseline="central"
        fill="var(--sheet)"
        className="font-text text-[12px] font-semibold"
      >
        {text}
      </text>
    </g>
  );
}
