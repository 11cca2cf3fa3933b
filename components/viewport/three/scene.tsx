'use client';
import { Canvas, useFrame, useThree } from '@react-three/fiber';
import { type RefObject, useEffect, useMemo } from 'react';
import { Plane } from 'three';
import type { PictureProps } from '../scene-props';
import { Bodies, Ghost } from './bodies';
import { CutCaps, cutPlanes } from './cut-caps';
import { Bed, Shadow } from './floor';
import { Lights } from './lights';
import { Rig } from './rig';

interface SceneProps extends PictureProps {
  /** carries the counters of frames drawn and buffers held, as data attributes */
  readonly stage: RefObject<HTMLElement | null>;
  readonly label: string;
  readonly describedBy: string;
  readonly onLost: () => void;
}

export default function Scene(props: SceneProps) {
  return (
    <Canvas
      orthographic
      flat
      frameloop="demand"
      resize={{ scroll: false }}
      dpr={[1, 2]}
      gl={{ antialias: true, alpha: true }}
      camera={{ up: [0, 0, 1], position: [0, -100, 50] }}
      onCreated={({ gl }) => {
        gl.localClippingEnabled = true;
      }}
    >
      <Lights />
      <Contents {...props} />
      <Rig
        box={props.box}
        now={props.now}
        insets={props.insets}
        fitKey={props.fitKey}
        onCommands={props.onCommands}
        onFrame={props.onFrame}
      />
      <Counters stage={props.stage} />
      <CanvasManners label={props.label} describedBy={props.describedBy} onLost={props.onLost} />
    </Canvas>
  );
}

function Contents({ section, ...props }: SceneProps) {
  const plane = useMemo(() => new Plane(), []);
  const planes = useMemo(() => cutPlanes(section, plane), [section, plane]);
  useFrame(({ camera, controls }) => {
    const target = (controls as { target?: { x: number; y: number; z: number } } | null)?.target;
    if (!section || !target) return;
    const towardsEye = camera.position[section.axis] - target[section.axis];
    const side = towardsEye > 0 ? -1 : 1;
    cutPlanes(section, plane);
    plane.normal.multiplyScalar(side);
    plane.constant *= side;
  });
  return (
    <>
      <Bodies {...props} planes={planes} />
      {section && <CutCaps {...props} section={section} />}
      <Ghost ghost={props.ghost} styles={props.styles} palette={props.palette} />
      {props.bed && <Bed box={props.now} palette={props.palette} />}
      {!section && (
        <Shadow moved={props.moved} styles={props.styles} box={props.now} ink={props.palette.shade} />
      )}
    </>
  );
}

function Counters({ stage }: Pick<SceneProps, 'stage'>) {
  useFrame(({ gl }) => {
    if (!stage.current) return;
    const { render, memory } = gl.info;
    Object.assign(stage.current.dataset, {
      frames: String(render.frame + 1),
      geometries: String(memory.geometries),
      textures: String(memory.textures),
    });
  });
  return null;
}

function CanvasManners({ label, describedBy, onLost }: Pick<SceneProps, 'label' | 'describedBy' | 'onLost'>) {
  const canvas = useThree((state) => state.gl.domElement);
  useEffect(() => {
    canvas.setAttribute('role', 'img');
    canvas.setAttribute('aria-label', label);
    canvas.setAttribute('aria-describedby', describedBy);
  }, [canvas, label, describedBy]);
  useEffect(() => {
    const lost = (event: Event) => {
      event.preventDefault();
      onLost();
    };
    canvas.addEventListener('webglcontextlost', lost);
    return () => canvas.removeEventListener('webglcontextlost', lost);
  }, [canvas, onLost]);
  return null;
}
