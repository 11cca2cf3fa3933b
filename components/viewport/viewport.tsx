'use client';
import { useCallback, useEffect, useId, useMemo, useRef, useState } from 'react';
import { describePicture } from './describe';
import { scaleEnd } from './drawing/ramp';
import type { ViewCommands } from './drawing/views';
import { BodyChips } from './hud/body-chips';
import { CutControl } from './hud/cut-control';
import { Overlay } from './hud/overlay';
import { Remark } from './hud/remark';
import { StrainLegend } from './hud/strain-legend';
import { ViewButtons } from './hud/view-buttons';
import { viewKey } from './keys';
import { bodyColour, usePalette } from './palette';
import { Picture } from './picture';
import type { BodyStyle } from './scene-props';
import type { BodyFacts, ViewportProps, ViewportState } from './types';
import { useArrangement } from './use-arrangement';
import { type Build, type BuildState, useBuild } from './use-build';
import { useCut } from './use-cut';
import { type Drawing, REMARKS, useDrawing } from './use-drawing';
import { useInsets } from './use-insets';
import { useOverlay } from './use-overlay';
import { Waiting } from './waiting';

const INSTRUCTIONS = '3-D view. Arrow keys turn, plus and minus zoom, F fits, 1 to 7 give standard views.';

function factsOf(build: Build | null): BodyFacts[] {
  return (build?.bodies ?? []).map(({ name, mesh, volume, bounds: b }) => ({
    name,
    triangles: mesh.indices.length / 3,
    volume,
    size: [b[3] - b[0], b[4] - b[1], b[5] - b[2]],
  }));
}

/** Bodies after the first are seen through, so that what moves inside them shows; not on the bed or cut open. */
function stylesOf(
  facts: readonly BodyFacts[],
  chosen: Readonly<Record<string, BodyStyle>>,
  allSolid: boolean,
): Record<string, BodyStyle> {
  const usual = (index: number): BodyStyle => (index > 0 && !allSolid ? 'see-through' : 'solid');
  return Object.fromEntries(facts.map(({ name }, index) => [name, chosen[name] ?? usual(index)]));
}

function stateOf({ build, message, buildMs }: BuildState, drawing: Drawing): ViewportState {
  const bodies = factsOf(build);
  const remark = message ?? REMARKS[drawing];
  const drawn = drawing === 'works' ? 'ready' : 'no-webgl';
  const status = message ? 'failed' : build && drawing !== 'unknown' ? drawn : 'loading';
  return { status, bodies, ...(remark && { message: remark }), ...(buildMs !== null && { buildMs }) };
}

function useReported(built: BuildState, drawing: Drawing, onState: ViewportProps['onState']): ViewportState {
  const state = useMemo(() => stateOf(built, drawing), [built, drawing]);
  useEffect(() => {
    onState?.(state);
  }, [onState, state]);
  return state;
}

/**
 * The part in 3-D. `motion` and `callouts` belong to `values`: pass the same objects as long as the values are the
 * same, for each new one is worked out and drawn afresh.
 */
export default function Viewport(props: ViewportProps) {
  const { family, values, motion, flex, paint, strainScale, showDimensions, cut, onBed, callouts } = props;
  const stage = useRef<HTMLDivElement>(null);
  const top = useRef<HTMLDivElement>(null);
  const bottom = useRef<HTMLDivElement>(null);
  const insets = useInsets(top, bottom);
  const descriptionId = useId();
  const palette = usePalette(stage);
  const { drawing, lose } = useDrawing();
  const [commands, setCommands] = useState<ViewCommands | null>(null);
  const [chosen, setChosen] = useState<Readonly<Record<string, BodyStyle>>>({});

  const built = useBuild(family, values, { motion, callouts });
  const state = useReported(built, drawing, props.onState);
  const flat = drawing === 'none' || drawing === 'lost';
  const shown = useArrangement(built.build, {
    flex,
    onBed,
    stance: props.stance,
    flat,
    ghosted: showDimensions,
  });
  const knife = useCut(cut, shown?.now ?? null);
  const facts = state.bodies ?? [];
  const styles = useMemo(() => stylesOf(facts, chosen, onBed || cut), [facts, chosen, onBed, cut]);
  const section = flat ? null : knife.section;
  const staging = useMemo(() => ({ styles, section }), [styles, section]);
  const { overlay, drawn, onFrame } = useOverlay(built, shown, props, stage, staging);
  const end = scaleEnd(built.build?.motion?.peakStrain ?? 0, strainScale);
  const choose = useCallback((name: string, style: BodyStyle) => {
    setChosen((now) => ({ ...now, [name]: style }));
  }, []);

  return (
    <section
      aria-label="Part in 3-D"
      className="relative h-full min-h-64 w-full overflow-hidden bg-linear-to-b from-sheet to-paper"
    >
      <div
        ref={stage}
        role="application"
        aria-label={INSTRUCTIONS}
        aria-describedby={descriptionId}
        // biome-ignore lint/a11y/noNoninteractiveTabindex: an application is worked by its keys, so it takes focus
        tabIndex={0}
        data-viewport={state.status}
        className="absolute inset-0 focus-visible:outline-offset-[-3px]"
        onKeyDown={(event) => viewKey(event, commands)}
      >
        {!drawn && state.status !== 'failed' && (
          <Waiting
            family={family}
            words={state.status === 'loading' ? 'Making the shape…' : 'Drawing the part…'}
          />
        )}
        {palette && shown && drawing !== 'unknown' && (
          <Picture
            {...shown}
            flat={flat}
            stage={stage}
            styles={styles}
            palette={palette}
            paint={onBed ? 'solid' : paint}
            scaleEnd={end}
            allowable={strainScale}
            section={section}
            insets={insets}
            fitKey={`${family} ${onBed} ${flat}`}
            label={`${facts.map(({ name }) => name).join(' and ')}, drawn to scale`}
            describedBy={descriptionId}
            onCommands={setCommands}
            onFrame={onFrame}
            onLost={lose}
          />
        )}
        <Overlay dimensions={overlay.dimensions} pin={overlay.pin} />
      </div>
      <p id={descriptionId} className="sr-only">
        {describePicture({
          bodies: facts,
          moment: motion && { label: motion.label, share: flex, by: motion.by },
          peak: shown?.peak ?? null,
          allowable: strainScale,
          onBed,
          cut: section !== null,
          peakCutAway: overlay.cutAway,
        })}
      </p>
      <div
        ref={top}
        className="pointer-events-none absolute inset-x-3 top-0 grid gap-2 pt-3 *:pointer-events-auto"
      >
        <div className="pointer-events-none flex flex-wrap items-start justify-between gap-2 *:pointer-events-auto">
          <ViewButtons commands={commands} />
          {paint === 'strain' && !onBed && (
            <StrainLegend
              scaleEnd={end}
              allowable={strainScale}
              peak={Math.abs(shown?.peak?.strain ?? 0)}
              by={built.build?.motion?.by ?? 'the formula'}
            />
          )}
        </div>
        <Remark state={state} layerStep={shown?.bed?.layerStep ?? null} />
      </div>
      <div
        ref={bottom}
        className="pointer-events-none absolute inset-x-3 bottom-0 flex flex-wrap items-end justify-between gap-2 pb-3 *:pointer-events-auto"
      >
        {palette && facts.length > 1 && (
          <BodyChips
            bodies={facts.map(({ name }, index) => ({ name, colour: bodyColour(palette, index) }))}
            styles={styles}
            onStyle={choose}
          />
        )}
        {section && <CutControl choice={knife.choice} at={section.at} onChoice={knife.choose} />}
      </div>
    </section>
  );
}
