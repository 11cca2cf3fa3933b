'use client';
import { type PointerEvent, useRef } from 'react';
import { PAINT_INK } from '@/components/viewport/drawing/ramp';
import { BEND_SIZE, type BendPicture } from './bend-picture';
import { MOST_PULL } from './sample';

interface StageProps {
  readonly picture: BendPicture;
  /** creases of the hook at rest */
  readonly rest: string;
  /** travel of the crest on the picture over the whole pull */
  readonly travel: { readonly x: number; readonly y: number };
  readonly pull: number;
  readonly onPull: (pull: number) => void;
  readonly label: string;
}

/** The hook itself. The ring on its catch can be taken hold of; the slider beside it does the same for keys. */
export function BendStage({ picture, rest, travel, pull, onPull, label }: StageProps) {
  const svg = useRef<SVGSVGElement>(null);
  const held = useRef<{ x: number; y: number; pull: number } | null>(null);

  function take(event: PointerEvent<SVGGElement>) {
    event.currentTarget.setPointerCapture(event.pointerId);
    held.current = { x: event.clientX, y: event.clientY, pull };
  }
  function move(event: PointerEvent<SVGGElement>) {
    if (!held.current || !svg.current) return;
    const shown = BEND_SIZE.width / svg.current.getBoundingClientRect().width;
    const along = (event.clientX - held.current.x) * travel.x + (event.clientY - held.current.y) * travel.y;
    const share = (shown * along) / (travel.x ** 2 + travel.y ** 2);
    onPull(Math.min(MOST_PULL, Math.max(0, held.current.pull + share * MOST_PULL)));
  }
  const drop = () => {
    held.current = null;
  };

  const { x, y } = picture.crest;
  return (
    <svg
      ref={svg}
      viewBox={`0 0 ${BEND_SIZE.width} ${BEND_SIZE.height}`}
      role="img"
      aria-label={label}
      className="mx-auto block h-auto w-full max-w-[27rem] select-none lg:max-w-[min(42rem,56dvh)]"
      strokeLinejoin="round"
    >
      <path d={rest} fill="none" stroke="var(--petrol)" strokeDasharray="5 5" opacity={0.75} />
      {picture.strokes.map(({ kind, path, fill }, index) => (
        <path
          // biome-ignore lint/suspicious/noArrayIndexKey: strokes have no identity but their place
          key={index}
          d={path}
          fill={fill}
          stroke={kind === 'face' ? fill : PAINT_INK}
          strokeWidth={kind === 'face' ? 1.7 : 1.5}
        />
      ))}
      <g
        data-grip
        className="cursor-grab touch-none active:cursor-grabbing"
        onPointerDown={take}
        onPointerMove={move}
        onPointerUp={drop}
        onPointerCancel={drop}
        transform={`translate(${x} ${y})`}
      >
        <circle r={46} fill="transparent" />
        <circle r={21} fill="var(--marker)" stroke={PAINT_INK} strokeWidth={2.5} />
        <path
          d="M-5-6l-6 6 6 6M5-6l6 6-6 6"
          fill="none"
          stroke={PAINT_INK}
          strokeWidth={2.5}
          strokeLinecap="round"
        />
      </g>
    </svg>
  );
}
