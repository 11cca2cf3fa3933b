'use client';
import { OrbitControls } from '@react-three/drei/core/OrbitControls';
import { useFrame, useThree } from '@react-three/fiber';
import { useCallback, useEffect, useLayoutEffect, useRef } from 'react';
import { type OrthographicCamera, TOUCH, Vector3 } from 'three';
import type { OrbitControls as Controls } from 'three-stdlib';
import type { Vec3 } from '@/lib/geometry/kernel';
import {
  type Direction,
  FILL,
  fitBox,
  frameOf,
  type Project,
  type ViewCommands,
  viewNamed,
} from '../drawing/views';
import { type Box, diagonalOf, joinBoxes } from '../mesh/bounds';
import type { PictureProps } from '../scene-props';

const DEGREES = 180 / Math.PI;
const CLOSEST = 400;
const TOUCHES = { ONE: TOUCH.ROTATE, TWO: TOUCH.DOLLY_ROTATE };
/** Shares of the picture beyond which the part is fitted anew while it is changed or moved. */
const TOO_LARGE = 0.98;
const TOO_SMALL = 0.42;

function directionOf(controls: Controls): Direction {
  return {
    turn: controls.getAzimuthalAngle() * DEGREES,
    rise: 90 - controls.getPolarAngle() * DEGREES,
  };
}

/**
 * The page scrolls over the picture: up and down with one finger, and by the wheel unless the picture has the focus
 * or Ctrl is held. Sideways one finger turns the part, two fingers turn and zoom.
 */
function leaveScrolling(canvas: HTMLElement, controls: Controls): () => void {
  canvas.style.touchAction = 'pan-y';
  const stage = canvas.closest<HTMLElement>('[data-viewport]')!;
  const gate = (event: WheelEvent) => {
    controls.enableZoom = event.ctrlKey || stage.contains(document.activeElement);
  };
  stage.addEventListener('wheel', gate, { capture: true, passive: true });
  return () => stage.removeEventListener('wheel', gate, { capture: true });
}

type RigProps = Pick<PictureProps, 'box' | 'now' | 'insets' | 'fitKey' | 'onCommands' | 'onFrame'>;

/** The eye: orbit, fit, standard views, and where points are on the screen. */
export function Rig({ box, now, insets, fitKey, onCommands, onFrame }: RigProps) {
  const camera = useThree((state) => state.camera) as OrthographicCamera;
  const size = useThree((state) => state.size);
  const element = useThree((state) => state.gl.domElement);
  const invalidate = useThree((state) => state.invalidate);
  const controls = useRef<Controls>(null);
  const current = useRef({ now, size, insets });
  current.current = { now, size, insets };

  const stand = useCallback(
    (direction: Direction, target: Vec3, scale: number) => {
      const distance = 4 * diagonalOf(current.current.now) + 50;
      const { eye } = frameOf({ turn: direction.turn, rise: Math.max(-90, Math.min(90, direction.rise)) });
      controls.current!.target.set(...target);
      camera.position.set(...target).addScaledVector(new Vector3(...eye), distance);
      camera.zoom = scale;
      camera.near = 0.1;
      camera.far = 3 * distance;
      camera.updateProjectionMatrix();
      controls.current!.update();
      invalidate();
    },
    [camera, invalidate],
  );
  const frameAll = useCallback(
    (direction: Direction, box: Box = current.current.now) => {
      const { size, insets } = current.current;
      const { target, scale } = fitBox(box, frameOf(direction), size, insets);
      stand(direction, target, scale);
    },
    [stand],
  );

  const first = useRef(true);
  // biome-ignore lint/correctness/useExhaustiveDependencies: fits when the key or the picture's size changes
  useLayoutEffect(() => {
    frameAll(first.current ? viewNamed('corner') : directionOf(controls.current!));
    first.current = false;
  }, [frameAll, fitKey, size.width, size.height, insets]);

  const filled = useCallback(
    (direction: Direction) => {
      const { now, size, insets } = current.current;
      return (FILL * camera.zoom) / fitBox(now, frameOf(direction), size, insets).scale;
    },
    [camera],
  );
  // biome-ignore lint/correctness/useExhaustiveDependencies: looks again when the part has moved
  useLayoutEffect(() => {
    const direction = directionOf(controls.current!);
    if (filled(direction) > TOO_LARGE) frameAll(direction, joinBoxes([box, now]));
  }, [now, filled, frameAll]);
  // biome-ignore lint/correctness/useExhaustiveDependencies: looks again when another part is shown
  useLayoutEffect(() => {
    const direction = directionOf(controls.current!);
    if (filled(direction) < TOO_SMALL) frameAll(direction);
  }, [box, filled, frameAll]);

  useEffect(() => {
    const target = () => controls.current!.target.toArray() as unknown as Vec3;
    const commands: ViewCommands = {
      fit: () => frameAll(directionOf(controls.current!)),
      look: (name) => frameAll(viewNamed(name)),
      turn(turn, rise) {
        const now = directionOf(controls.current!);
        stand({ turn: now.turn + turn, rise: now.rise + rise }, target(), camera.zoom);
      },
      zoom(factor) {
        const scale = Math.min(CLOSEST, Math.max(0.2, camera.zoom * factor));
        stand(directionOf(controls.current!), target(), scale);
      },
    };
    onCommands(commands);
    return () => onCommands(null);
  }, [camera, frameAll, stand, onCommands]);

  useEffect(() => leaveScrolling(element, controls.current!), [element]);

  useFrame(() => {
    camera.updateMatrixWorld();
    const { width, height } = current.current.size;
    const matrix = camera.projectionMatrix.clone().multiply(camera.matrixWorldInverse);
    const point = new Vector3();
    const project: Project = (at) => {
      point.set(...at).applyMatrix4(matrix);
      return { x: ((point.x + 1) / 2) * width, y: ((1 - point.y) / 2) * height, depth: -point.z };
    };
    const eye = camera.position.clone().sub(controls.current!.target).normalize();
    onFrame(project, { width, height }, eye.toArray() as unknown as Vec3);
  });

  return (
    <OrbitControls
      ref={controls}
      makeDefault
      domElement={element}
      enableDamping={false}
      minZoom={0.2}
      maxZoom={CLOSEST}
      touches={TOUCHES}
    />
  );
}
