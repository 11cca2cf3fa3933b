'use client';
import { useEffect, useLayoutEffect, useMemo, useRef, useState } from 'react';
import { paintPicture } from './drawing/painter';
import type { Rgb } from './drawing/ramp';
import {
  type Direction,
  type Extent,
  type Fit,
  fitBox,
  frameOf,
  parallel,
  type ViewCommands,
  viewNamed,
} from './drawing/views';
import { bodyColour } from './palette';
import type { PictureProps } from './scene-props';

interface Stand {
  readonly direction: Direction;
  readonly closer: number;
}

const START: Stand = { direction: viewNamed('corner'), closer: 1 };

const asRgb = (hex: string): Rgb =>
  [1, 3, 5].map((at) => Number.parseInt(hex.slice(at, at + 2), 16) / 255) as unknown as Rgb;

function useExtent(element: React.RefObject<Element | null>): Extent {
  const [size, setSize] = useState<Extent>({ width: 600, height: 400 });
  useEffect(() => {
    const observer = new ResizeObserver(([entry]) => {
      if (entry) setSize({ width: entry.contentRect.width, height: entry.contentRect.height });
    });
    if (element.current) observer.observe(element.current);
    return () => observer.disconnect();
  }, [element]);
  return size;
}

interface FlatProps extends PictureProps {
  readonly label: string;
  readonly describedBy: string;
}

/** The part drawn on the processor, for browsers without WebGL. Same views, keys and dimensions. */
export default function FlatPicture(props: FlatProps) {
  const { moved, styles, palette, paint, scaleEnd, now: box, insets, onCommands, onFrame } = props;
  const svg = useRef<SVGSVGElement>(null);
  const size = useExtent(svg);
  const [stand, setStand] = useState(START);
  const frame = useMemo(() => frameOf(stand.direction), [stand.direction]);
  const fit: Fit = useMemo(() => fitBox(box, frame, size, insets), [box, frame, size, insets]);
  const project = useMemo(
    () => parallel(frame, fit.target, fit.scale * stand.closer, size),
    [frame, fit, stand.closer, size],
  );
  const strokes = useMemo(() => {
    const bodies = moved.flatMap((one, index) =>
      styles[one.body.name] === 'hidden'
        ? []
        : [
            {
              moved: one,
              colour: asRgb(bodyColour(palette, index)),
              seeThrough: styles[one.body.name] === 'see-through',
            },
          ],
    );
    return paintPicture(bodies, frame, project, paint === 'strain' ? scaleEnd : null);
  }, [moved, styles, palette, frame, project, paint, scaleEnd]);

  useEffect(() => {
    const commands: ViewCommands = {
      fit: () => setStand(({ direction }) => ({ direction, closer: 1 })),
      look: (name) => setStand({ direction: viewNamed(name), closer: 1 }),
      turn: (turn, rise) =>
        setStand(({ direction, closer }) => ({
          direction: {
            turn: direction.turn + turn,
            rise: Math.max(-90, Math.min(90, direction.rise + rise)),
          },
          closer,
        })),
      zoom: (factor) =>
        setStand((now) => ({ ...now, closer: Math.min(20, Math.max(0.2, now.closer * factor)) })),
    };
    onCommands(commands);
    return () => onCommands(null);
  }, [onCommands]);
  useLayoutEffect(() => onFrame(project, size, frame.eye), [onFrame, project, size, frame]);

  return (
    <svg
      ref={svg}
      role="img"
      aria-label={props.label}
      aria-describedby={props.describedBy}
      className="absolute inset-0 h-full w-full"
      strokeLinejoin="round"
    >
      {strokes.map(({ kind, path, fill }, index) => (
        <path
          // biome-ignore lint/suspicious/noArrayIndexKey: strokes have no identity but their place
          key={index}
          d={path}
          fill={fill}
          stroke={kind === 'face' ? fill : palette.ink}
          strokeWidth={kind === 'face' ? 0.6 : 1}
        />
      ))}
    </svg>
  );
}
