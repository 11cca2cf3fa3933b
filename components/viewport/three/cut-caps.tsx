'use client';
import { useEffect, useMemo } from 'react';
import {
  BufferAttribute,
  BufferGeometry,
  DataTexture,
  DoubleSide,
  LinearFilter,
  LinearMipmapLinearFilter,
  type Plane,
  RepeatWrapping,
  ShapeUtils,
  Vector2,
} from 'three';
import { type Moved, meshOf } from '../mesh/arrange';
import { diagonalOf } from '../mesh/bounds';
import { type Axis, flatten, type Outline, signedArea, slice } from '../mesh/slice';
import { bodyColour, mix } from '../palette';
import type { PictureProps, Section } from '../scene-props';

type Point = [number, number];

function inside([x, y]: Point, loop: readonly Point[]): boolean {
  let within = false;
  loop.forEach(([ax, ay], k) => {
    const [bx, by] = loop[(k + 1) % loop.length]!;
    if (ay > y !== by > y && x < ax + ((y - ay) / (by - ay)) * (bx - ax)) within = !within;
  });
  return within;
}

interface Region {
  readonly outer: number;
  readonly holes: number[];
}

/** Each hole goes to the smallest outline around it. */
function regionsOf(loops: readonly Point[][]): Region[] {
  const areas = loops.map(signedArea);
  const regions = loops.flatMap((_, k) => (areas[k]! > 0 ? [{ outer: k, holes: [] as number[] }] : []));
  loops.forEach((loop, k) => {
    if (areas[k]! >= 0) return;
    const around = regions
      .filter(({ outer }) => inside(loop[0]!, loops[outer]!))
      .sort((a, b) => areas[a.outer]! - areas[b.outer]!);
    around[0]?.holes.push(k);
  });
  return regions;
}

/** Fills the outlines of a section; texture coordinates in hatch periods. */
function capGeometry(outlines: readonly Outline[], axis: Axis, period: number, lean: 1 | -1): BufferGeometry {
  const loops = outlines.map((outline) => flatten(outline, axis));
  const positions: number[] = [];
  const uv: number[] = [];
  const indices: number[] = [];
  for (const { outer, holes } of regionsOf(loops)) {
    const base = positions.length / 3;
    const asVectors = (k: number) => loops[k]!.map(([x, y]) => new Vector2(x, y));
    const triangles = ShapeUtils.triangulateShape(asVectors(outer), holes.map(asVectors));
    for (const k of [outer, ...holes]) {
      positions.push(...outlines[k]!);
      uv.push(...loops[k]!.flatMap(([x, y]) => [(lean * x) / period, y / period]));
    }
    indices.push(...triangles.flat().map((vertex) => base + vertex));
  }
  return new BufferGeometry()
    .setAttribute('position', new BufferAttribute(Float32Array.from(positions), 3))
    .setAttribute('uv', new BufferAttribute(Float32Array.from(uv), 2))
    .setIndex(indices);
}

function outlineGeometry(outlines: readonly Outline[]): BufferGeometry {
  const positions = outlines.flatMap((outline) => {
    const count = outline.length / 3;
    return Array.from({ length: count }, (_, k) => [
      ...outline.subarray(3 * k, 3 * k + 3),
      ...outline.subarray(3 * ((k + 1) % count), 3 * ((k + 1) % count) + 3),
    ]).flat();
  });
  return new BufferGeometry().setAttribute('position', new BufferAttribute(Float32Array.from(positions), 3));
}

const TILE = 32;

/** One diagonal line a tile, white on clear, tinted by the material. */
function hatchTexture(): DataTexture {
  const data = new Uint8Array(4 * TILE * TILE).fill(255);
  for (let row = 0; row < TILE; row += 1) {
    for (let column = 0; column < TILE; column += 1) {
      const away = Math.abs(((row + column) % TILE) - TILE / 2);
      data[4 * (row * TILE + column) + 3] = away < 3 ? 255 : 0;
    }
  }
  const texture = new DataTexture(data, TILE, TILE);
  texture.wrapS = RepeatWrapping;
  texture.wrapT = RepeatWrapping;
  texture.magFilter = LinearFilter;
  texture.minFilter = LinearMipmapLinearFilter;
  texture.generateMipmaps = true;
  texture.needsUpdate = true;
  return texture;
}

interface CapProps {
  readonly moved: Moved;
  readonly section: Section;
  readonly period: number;
  readonly lean: 1 | -1;
  readonly fill: string;
  readonly ink: string;
  readonly hatch: DataTexture;
}

function Cap({ moved, section, period, lean, fill, ink, hatch }: CapProps) {
  const [cap, outline] = useMemo(() => {
    const outlines = slice(meshOf(moved), section.axis, section.at);
    return [capGeometry(outlines, section.axis, period, lean), outlineGeometry(outlines)];
  }, [moved, section.axis, section.at, period, lean]);
  useEffect(
    () => () => {
      cap.dispose();
      outline.dispose();
    },
    [cap, outline],
  );
  return (
    <>
      <mesh geometry={cap} frustumCulled={false} renderOrder={2}>
        <meshBasicMaterial color={fill} side={DoubleSide} polygonOffset polygonOffsetFactor={0.5} />
      </mesh>
      <mesh geometry={cap} frustumCulled={false} renderOrder={3}>
        <meshBasicMaterial
          color={ink}
          map={hatch}
          transparent
          opacity={0.55}
          side={DoubleSide}
          depthWrite={false}
        />
      </mesh>
      <lineSegments geometry={outline} frustumCulled={false} renderOrder={3}>
        <lineBasicMaterial color={ink} />
      </lineSegments>
    </>
  );
}

type CapsProps = Pick<PictureProps, 'moved' | 'styles' | 'palette' | 'box'> & { readonly section: Section };

/** Cut faces, hatched; neighbouring bodies are hatched the other way. */
export function CutCaps({ moved, styles, palette, box, section }: CapsProps) {
  const hatch = useMemo(hatchTexture, []);
  useEffect(() => () => hatch.dispose(), [hatch]);
  const period = diagonalOf(box) / 42;
  return moved.map((one, index) =>
    styles[one.body.name] === 'hidden' ? null : (
      <Cap
        key={one.body.name}
        moved={one}
        section={section}
        period={period}
        lean={index % 2 === 0 ? 1 : -1}
        fill={mix(bodyColour(palette, index), palette.sheet, 0.35)}
        ink={palette.ink}
        hatch={hatch}
      />
    ),
  );
}

export const cutPlanes = (section: Section | null, plane: Plane): Plane[] => {
  if (!section) return [];
  plane.normal.set(Number(section.axis === 'x'), Number(section.axis === 'y'), Number(section.axis === 'z'));
  plane.constant = -section.at;
  return [plane];
};
