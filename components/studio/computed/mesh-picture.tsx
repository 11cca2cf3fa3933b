import { useMemo } from 'react';
import { scaleEnd } from '@/components/viewport/drawing/ramp';
import { StrainLegend } from '@/components/viewport/hud/strain-legend';
import { countedPeak } from '@/generators/computed';
import type { BendingPlane } from '@/generators/contract';
import type { Solved } from '@/lib/fea/solve/solution';
import { formatQuantity } from '@/lib/units';
import { drawMesh, type MeshDrawing } from './mesh-drawing';

function Lines({ drawing, bent }: { drawing: MeshDrawing; bent: boolean }) {
  return (
    <g fill="none" strokeLinecap="round" className="[&>path]:[vector-effect:non-scaling-stroke]">
      {drawing.fills.map(({ colour, path }) => (
        <path
          key={colour}
          d={path}
          fill={colour}
          stroke="#0f2a2e"
          strokeWidth="0.5"
          strokeOpacity="0.75"
          strokeLinejoin="round"
        />
      ))}
      {bent && (
        <path d={drawing.rest} stroke="var(--ink)" strokeWidth="1" strokeDasharray="4 3" opacity="0.6" />
      )}
      <path d={drawing.held} stroke="var(--marker)" strokeWidth="5" />
      <path d={drawing.pushed} stroke="var(--petrol)" strokeWidth="5" />
    </g>
  );
}

function Key({ className, children }: { className: string; children: string }) {
  return (
    <li className="flex items-center gap-2">
      <i aria-hidden="true" className={`inline-block h-1.5 w-6 ${className}`} />
      {children}
    </li>
  );
}

interface MeshPictureProps {
  readonly solution: Solved;
  readonly plane: BendingPlane;
  readonly allowable: number | null;
  readonly bent: boolean;
}

/** The triangles the part was cut into, painted with their strain, at true scale. */
export function MeshPicture({ solution, plane, allowable, bent }: MeshPictureProps) {
  const peak = countedPeak(solution, plane);
  const strain = Math.abs(peak.strain);
  const end = scaleEnd(strain, allowable);
  const drawing = useMemo(
    () => drawMesh(solution, plane.model, { t: bent ? 1 : 0, end, peak: peak.node }),
    [solution, plane, bent, end, peak.node],
  );
  const { x, y, width, height } = drawing.box;
  const marked = `${formatQuantity(strain, 'strain')} in ${peak.strain < 0 ? 'compression' : 'tension'}`;
  return (
    <figure className="grid justify-items-start gap-3">
      <svg
        role="img"
        aria-label={`Mesh of ${solution.elements} triangles, ${bent ? `bent, largest strain ${marked}` : 'at rest'}`}
        viewBox={`${x} ${y} ${width} ${height}`}
        className="max-h-[30rem] w-full"
        style={{ aspectRatio: `${width} / ${height}` }}
      >
        <Lines drawing={drawing} bent={bent} />
        {bent && (
          <circle
            cx={drawing.peak.x}
            cy={drawing.peak.y}
            r={Math.max(width, height) / 60}
            fill="none"
            stroke="var(--ink)"
            strokeWidth="2"
            vectorEffect="non-scaling-stroke"
          />
        )}
      </svg>
      <figcaption className="grid gap-2 text-sm">
        {bent && (
          <div className="w-fit">
            <StrainLegend scaleEnd={end} allowable={allowable} peak={strain} by="finite elements" />
          </div>
        )}
        <ul className="flex flex-wrap gap-x-5 gap-y-1 text-muted">
          <Key className="bg-marker">held</Key>
          <Key className="bg-petrol">pushed</Key>
          {plane.model.mirrored && <li>Half of it; the other half is its mirror image.</li>}
        </ul>
      </figcaption>
    </figure>
  );
}
