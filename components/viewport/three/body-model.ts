import { BufferAttribute, BufferGeometry, DynamicDrawUsage } from 'three';
import type { Moved } from '../mesh/arrange';
import type { PreparedBody } from '../mesh/prepare';
import { writeDrawn } from '../mesh/shading';

/** The buffers of one body on the graphics card. Made once a build, rewritten as the part moves. */
export interface BodyModel {
  readonly faces: BufferGeometry;
  readonly creases: BufferGeometry;
  show(moved: Moved): void;
  dispose(): void;
}

function attribute(items: number, size: number): BufferAttribute {
  return new BufferAttribute(new Float32Array(items * size), size).setUsage(DynamicDrawUsage);
}

export function bodyModel({ mesh, shading }: PreparedBody): BodyModel {
  const drawn = shading.source.length;
  const [position, normal, strain] = [attribute(drawn, 3), attribute(drawn, 3), attribute(drawn, 1)];
  const corner = attribute(mesh.positions.length / 3, 3);
  const faces = new BufferGeometry()
    .setAttribute('position', position)
    .setAttribute('normal', normal)
    .setAttribute('strain', strain)
    .setIndex(new BufferAttribute(shading.indices, 1));
  const creases = new BufferGeometry()
    .setAttribute('position', corner)
    .setIndex(new BufferAttribute(shading.edges, 1));
  return {
    faces,
    creases,
    show(moved) {
      writeDrawn(moved.positions, shading, position.array as Float32Array, normal.array as Float32Array);
      for (let k = 0; k < drawn; k += 1) strain.array[k] = moved.strain[shading.source[k]!]!;
      corner.array.set(moved.positions);
      for (const one of [position, normal, strain, corner]) one.needsUpdate = true;
    },
    dispose() {
      faces.dispose();
      creases.dispose();
    },
  };
}
