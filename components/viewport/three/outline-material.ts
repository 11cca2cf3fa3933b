import { BackSide, MeshBasicMaterial, Vector2 } from 'three';

/**
 * Ink around rounded shapes, where there is no crease to draw: the inside of the part, grown by a little more than
 * a pixel on the screen. Slivers that bending turned over belong to a side that is seen, as their normals tell, and
 * are left out.
 */
export function outlineMaterial(): MeshBasicMaterial & { userData: { picture: Vector2 } } {
  const picture = new Vector2(1, 1);
  const material = new MeshBasicMaterial({ side: BackSide });
  material.onBeforeCompile = (shader) => {
    shader.uniforms.uPicture = { value: picture };
    shader.vertexShader = shader.vertexShader
      .replace('#include <common>', '#include <common>\nuniform vec2 uPicture;\nvarying float vTowardsEye;')
      .replace(
        '#include <project_vertex>',
        `#include <project_vertex>
vec3 seen = normalMatrix * normal;
vTowardsEye = seen.z;
vec2 away = (projectionMatrix * vec4(seen, 0.0)).xy * uPicture;
gl_Position.xy += 2.4 * away / max(length(away), 1e-6) / uPicture;`,
      );
    shader.fragmentShader = shader.fragmentShader
      .replace('#include <common>', '#include <common>\nvarying float vTowardsEye;')
      .replace('#include <color_fragment>', 'if (vTowardsEye > 0.05) discard;');
  };
  material.userData.picture = picture;
  return material as MeshBasicMaterial & { userData: { picture: Vector2 } };
}
