'use client';
import { useThree } from '@react-three/fiber';
import { useEffect, useLayoutEffect, useMemo } from 'react';
import { DoubleSide, type Plane } from 'three';
import { PAINT_INK } from '../drawing/ramp';
import type { Moved } from '../mesh/arrange';
import { bodyColour } from '../palette';
import type { BodyStyle, PictureProps } from '../scene-props';
import { bodyModel } from './body-model';
import { outlineMaterial } from './outline-material';
import { rampTexture, type SurfaceLook, surfaceMaterial } from './surface-material';

interface BodyProps {
  readonly moved: Moved;
  readonly style: BodyStyle;
  readonly look: SurfaceLook;
  readonly ramp: ReturnType<typeof rampTexture>;
}

function Body({ moved, style, look, ramp }: BodyProps) {
  const model = useMemo(() => bodyModel(moved.body), [moved.body]);
  const surface = useMemo(() => surfaceMaterial(ramp), [ramp]);
  useEffect(() => () => model.dispose(), [model]);
  const outline = useMemo(outlineMaterial, []);
  const size = useThree((state) => state.size);
  useEffect(() => () => surface.material.dispose(), [surface]);
  useEffect(() => () => outline.dispose(), [outline]);
  useLayoutEffect(() => model.show(moved), [model, moved]);
  surface.apply(look);
  outline.color.set(look.rim);
  outline.clippingPlanes = look.planes;
  outline.userData.picture.set(size.width, size.height);
  const seeThrough = style === 'see-through';
  return (
    <group visible={style !== 'hidden'}>
      <mesh
        geometry={model.faces}
        material={surface.material}
        frustumCulled={false}
        renderOrder={seeThrough ? 4 : 1}
      />
      {seeThrough && (
        <mesh geometry={model.faces} frustumCulled={false} renderOrder={3}>
          <meshBasicMaterial
            colorWrite={false}
            side={DoubleSide}
            clippingPlanes={look.planes}
            polygonOffset
            polygonOffsetFactor={1.5}
            polygonOffsetUnits={2}
          />
        </mesh>
      )}
      <mesh
        geometry={model.faces}
        material={outline}
        frustumCulled={false}
        renderOrder={seeThrough ? 3.5 : 1}
      />
      <lineSegments geometry={model.creases} frustumCulled={false} renderOrder={seeThrough ? 5 : 2}>
        <lineBasicMaterial
          color={seeThrough ? look.rim : look.line}
          transparent
          opacity={seeThrough ? 0.75 : 0.85}
          clippingPlanes={look.planes}
        />
      </lineSegments>
    </group>
  );
}

type BodiesProps = Pick<
  PictureProps,
  'moved' | 'styles' | 'palette' | 'paint' | 'scaleEnd' | 'allowable' | 'bed'
> & { readonly planes: Plane[] };

export function Bodies({ moved, styles, palette, paint, scaleEnd, allowable, bed, planes }: BodiesProps) {
  const ramp = useMemo(rampTexture, []);
  useEffect(() => () => ramp.dispose(), [ramp]);
  const strained = paint === 'strain';
  return moved.map((one, index) => {
    const style = styles[one.body.name] ?? 'solid';
    return (
      <Body
        key={one.body.name}
        moved={one}
        style={style}
        ramp={ramp}
        look={{
          colour: bodyColour(palette, index),
          line: strained ? PAINT_INK : palette.ink,
          rim: palette.ink,
          seeThrough: style === 'see-through',
          strained,
          scaleEnd,
          allowable: allowable ?? Infinity,
          layerStep: bed?.layerStep ?? 0,
          planes,
        }}
      />
    );
  });
}

/** Where the part was before it bent. */
export function Ghost({ ghost, styles, palette }: Pick<PictureProps, 'ghost' | 'styles' | 'palette'>) {
  return ghost
    .filter(({ body }) => styles[body.name] === 'solid')
    .map((one) => <GhostBody key={one.body.name} moved={one} colour={palette.petrol} />);
}

function GhostBody({ moved, colour }: { moved: Moved; colour: string }) {
  const model = useMemo(() => bodyModel(moved.body), [moved.body]);
  useEffect(() => () => model.dispose(), [model]);
  useLayoutEffect(() => model.show(moved), [model, moved]);
  return (
    <lineSegments geometry={model.creases} frustumCulled={false} renderOrder={3}>
      <lineBasicMaterial color={colour} transparent opacity={0.5} depthWrite={false} />
    </lineSegments>
  );
}
