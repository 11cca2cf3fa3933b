'use client';
import { useEffect, useMemo } from 'react';
import { BufferAttribute, BufferGeometry, DataTexture, LinearFilter } from 'three';
import { meshOf } from '../mesh/arrange';
import { BED_SQUARE, type Box, bedUnder } from '../mesh/bounds';
import { footprint } from '../mesh/footprint';
import { mix, type Palette } from '../palette';
import type { PictureProps } from '../scene-props';

function shadowTexture(shade: Uint8Array, size: number): DataTexture {
  const data = new Uint8Array(4 * shade.length).fill(255);
  shade.forEach((value, k) => {
    data[4 * k + 3] = value;
  });
  const texture = new DataTexture(data, size, size);
  texture.magFilter = LinearFilter;
  texture.minFilter = LinearFilter;
  texture.needsUpdate = true;
  return texture;
}

type ShadowProps = Pick<PictureProps, 'moved' | 'styles' | 'box'> & { readonly ink: string };

/** A soft shadow on the floor, seen from above only. */
export function Shadow({ moved, styles, box, ink }: ShadowProps) {
  const print = useMemo(
    () => footprint(moved.filter(({ body }) => styles[body.name] !== 'hidden').map(meshOf), box),
    [moved, styles, box],
  );
  const texture = useMemo(() => shadowTexture(print.shade, print.size), [print]);
  useEffect(() => () => texture.dispose(), [texture]);
  return (
    <mesh position={[print.centre[0], print.centre[1], box.min[2] - 0.02]} renderOrder={0}>
      <planeGeometry args={[print.width, print.width]} />
      <meshBasicMaterial color={ink} map={texture} transparent opacity={0.4} depthWrite={false} />
    </mesh>
  );
}

function gridLines(x0: number, x1: number, y0: number, y1: number): BufferGeometry {
  const points: number[] = [];
  for (let x = x0; x <= x1 + 1e-6; x += BED_SQUARE) points.push(x, y0, 0, x, y1, 0);
  for (let y = y0; y <= y1 + 1e-6; y += BED_SQUARE) points.push(x0, y, 0, x1, y, 0);
  return new BufferGeometry().setAttribute('position', new BufferAttribute(Float32Array.from(points), 3));
}

/** The bed under the parts: a plate with squares of 10 mm. */
export function Bed({ box, palette }: { box: Box; palette: Palette }) {
  const {
    min: [x0, y0],
    max: [x1, y1],
  } = bedUnder(box);
  const lines = useMemo(() => gridLines(x0, x1, y0, y1), [x0, x1, y0, y1]);
  useEffect(() => () => lines.dispose(), [lines]);
  return (
    <group position={[0, 0, -0.06]}>
      <mesh position={[(x0 + x1) / 2, (y0 + y1) / 2, -0.9]}>
        <boxGeometry args={[x1 - x0, y1 - y0, 1.7]} />
        <meshStandardMaterial color={mix(palette.paper, palette.edge, 0.3)} roughness={0.9} />
      </mesh>
      <lineSegments geometry={lines}>
        <lineBasicMaterial color={palette.edge} transparent opacity={0.7} />
      </lineSegments>
    </group>
  );
}
