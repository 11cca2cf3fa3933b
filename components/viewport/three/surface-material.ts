import {
  Color,
  DataTexture,
  DoubleSide,
  LinearFilter,
  MeshStandardMaterial,
  type Plane,
  ShaderChunk,
  SRGBColorSpace,
  type Texture,
} from 'three';
import { PAINT_OVER, strainColour } from '../drawing/ramp';

const RAMP_SIZE = 257;

/** Compression on the left, tension on the right, no strain in the middle. */
export function rampTexture(): Texture {
  const data = new Uint8Array(4 * RAMP_SIZE);
  for (let k = 0; k < RAMP_SIZE; k += 1) {
    const colour = strainColour((2 * k) / (RAMP_SIZE - 1) - 1);
    data.set([...colour.map((c) => Math.round(255 * c)), 255], 4 * k);
  }
  const texture = new DataTexture(data, RAMP_SIZE, 1);
  texture.colorSpace = SRGBColorSpace;
  texture.magFilter = LinearFilter;
  texture.minFilter = LinearFilter;
  texture.needsUpdate = true;
  return texture;
}

export interface SurfaceLook {
  readonly colour: string;
  /** creases and layer lines */
  readonly line: string;
  /** around the body */
  readonly rim: string;
  readonly seeThrough: boolean;
  readonly strained: boolean;
  /** strain at the end of the scale */
  readonly scaleEnd: number;
  /** allowable strain, or infinity where it is not known */
  readonly allowable: number;
  /** distance of layer lines in mm, 0 for none */
  readonly layerStep: number;
  readonly planes: Plane[];
}

export interface SurfaceMaterial {
  readonly material: MeshStandardMaterial;
  apply(look: SurfaceLook): void;
}

/** Enough to be there over what it covers, little enough to see how that sits inside. */
const SEE_THROUGH = { plain: 0.62, strained: 0.5 };

const VERTEX_HEAD = /* glsl */ `
attribute float strain;
varying float vStrain;
varying float vHeight;`;

const VERTEX_BODY = /* glsl */ `
vStrain = strain;
vHeight = (modelMatrix * vec4(transformed, 1.0)).z;`;

const FRAGMENT_HEAD = /* glsl */ `
varying float vStrain;
varying float vHeight;
uniform sampler2D uRamp;
uniform float uStrained;
uniform float uScaleEnd;
uniform float uAllowable;
uniform float uLayerStep;
uniform float uFlat;
uniform vec3 uInk;
uniform vec3 uOver;

float stripes(float along, float period, float share) {
  float at = abs(fract(along / period) - 0.5) * period;
  return 1.0 - smoothstep(share * period * 0.5 - 0.5, share * period * 0.5 + 0.5, at);
}`;

const FRAGMENT_COLOUR = /* glsl */ `
if (uStrained > 0.5) {
  float share = clamp(vStrain / uScaleEnd, -1.0, 1.0);
  vec3 painted = texture2D(uRamp, vec2(share * 0.5 * ${((RAMP_SIZE - 1) / RAMP_SIZE).toFixed(6)} + 0.5, 0.5)).rgb;
  float squeezed = smoothstep(0.03, 0.1, -share);
  painted = mix(painted, uInk, 0.3 * squeezed * stripes(gl_FragCoord.x - gl_FragCoord.y, 9.0, 0.16));
  float beyond = abs(vStrain) - uAllowable;
  if (beyond > 0.0) painted = mix(painted, uOver, 0.85 * stripes(gl_FragCoord.x + gl_FragCoord.y, 11.0, 0.4));
  float border = abs(beyond) / max(fwidth(vStrain), 1e-9);
  painted = mix(painted, uOver, 1.0 - smoothstep(1.0, 2.2, border));
  diffuseColor.rgb = painted;
}
if (uLayerStep > 0.0) {
  float away = abs(fract(vHeight / uLayerStep) - 0.5) * uLayerStep / max(fwidth(vHeight), 1e-9);
  diffuseColor.rgb = mix(diffuseColor.rgb, uInk, 0.4 * (1.0 - smoothstep(0.4, 1.3, away)));
}
vec3 ownLight = diffuseColor.rgb * uFlat;
diffuseColor.rgb *= 1.0 - uFlat;`;

/**
 * The normals given hold for both sides of a triangle: slivers that bending turned over belong to the side that is
 * seen, and left out they would be cracks.
 */
const GIVEN_NORMALS = ShaderChunk.normal_fragment_begin.replace('gl_FrontFacing ? 1.0 : - 1.0', '1.0');

/** A matt plastic that can be painted by strain, hatched where squeezed or beyond the allowable, and lined by layers. */
export function surfaceMaterial(ramp: Texture): SurfaceMaterial {
  const material = new MeshStandardMaterial({
    roughness: 0.62,
    metalness: 0,
    side: DoubleSide,
    polygonOffset: true,
    polygonOffsetFactor: 1,
    polygonOffsetUnits: 1,
  });
  const uniforms = {
    uRamp: { value: ramp },
    uStrained: { value: 0 },
    uScaleEnd: { value: 1 },
    uAllowable: { value: Infinity },
    uLayerStep: { value: 0 },
    uFlat: { value: 0 },
    uInk: { value: new Color() },
    uOver: { value: new Color(PAINT_OVER) },
  };
  material.onBeforeCompile = (shader) => {
    Object.assign(shader.uniforms, uniforms);
    shader.vertexShader = shader.vertexShader
      .replace('#include <common>', `#include <common>${VERTEX_HEAD}`)
      .replace('#include <begin_vertex>', `#include <begin_vertex>${VERTEX_BODY}`);
    shader.fragmentShader = shader.fragmentShader
      .replace('#include <common>', `#include <common>${FRAGMENT_HEAD}`)
      .replace('#include <normal_fragment_begin>', GIVEN_NORMALS)
      .replace('#include <color_fragment>', `#include <color_fragment>${FRAGMENT_COLOUR}`)
      .replace(
        '#include <emissivemap_fragment>',
        '#include <emissivemap_fragment>\ntotalEmissiveRadiance += ownLight;',
      );
  };
  return {
    material,
    apply(look) {
      material.color.set(look.colour);
      material.transparent = look.seeThrough;
      material.opacity = look.seeThrough ? SEE_THROUGH[look.strained ? 'strained' : 'plain'] : 1;
      material.depthWrite = !look.seeThrough;
      material.clippingPlanes = look.planes;
      uniforms.uInk.value.set(look.line);
      uniforms.uStrained.value = look.strained ? 1 : 0;
      uniforms.uFlat.value = look.strained ? 0.62 : 0;
      uniforms.uScaleEnd.value = look.scaleEnd;
      uniforms.uAllowable.value = Math.min(look.allowable, 1e3);
      uniforms.uLayerStep.value = look.layerStep;
    },
  };
}
