'use client';
import { useFrame, useThree } from '@react-three/fiber';
import { useRef } from 'react';
import { type DirectionalLight, Vector3 } from 'three';

const KEY = new Vector3(-0.55, 0.85, 0.75);
const FILL_IN = new Vector3(0.9, 0.15, 0.45);

/** A neutral studio that goes with the eye, so that every view is lit from its upper left. */
export function Lights() {
  const camera = useThree((state) => state.camera);
  const key = useRef<DirectionalLight>(null);
  const fill = useRef<DirectionalLight>(null);
  useFrame(() => {
    key.current?.position.copy(KEY).applyQuaternion(camera.quaternion);
    fill.current?.position.copy(FILL_IN).applyQuaternion(camera.quaternion);
  });
  return (
    <>
      <ambientLight intensity={1.45} />
      <directionalLight ref={key} intensity={1.8} />
      <directionalLight ref={fill} intensity={0.26} />
    </>
  );
}
