import {
  BufferAttribute,
  BufferGeometry,
  type DataTexture,
  DoubleSide,
  GLSL3,
  Mesh,
  ShaderMaterial,
  Vector2,
} from 'three';
import { breakShape } from '../drawing/break-mark.js';
import type { Wash } from '../drawing/drawing.js';
import { inkNumber, techniqueInkName } from '../inks.js';
import type { StackLayout } from '../stack-layout.js';
import { inkDeclaration, type PageUniforms } from './ink-uniforms.js';
import { triangles } from './triangles.js';

const mostBreaks = 2;

/**
 * Transparent faces whose ink is looked up by the height they lie at. The beam is left out between
 * the two lines of a break mark.
 */
export function washMaterial(uniforms: PageUniforms): ShaderMaterial {
  return new ShaderMaterial({
    glslVersion: GLSL3,
    side: DoubleSide,
    transparent: true,
    depthWrite: false,
    uniforms: {
      ...uniforms,
      density: { value: null as DataTexture | null },
      beamLength: { value: 1 },
      breaks: { value: Array.from({ length: mostBreaks }, () => 0) },
      breakSize: { value: new Vector2() },
      breakGap: { value: 0 },
    },
    vertexShader: /* glsl */ `
      in vec3 style;
      out vec2 place;
      flat out vec3 look;
      void main() {
        place = position.xy;
        look = style;
        gl_Position = projectionMatrix * vec4(position, 1.0);
      }`,
    fragmentShader: /* glsl */ `
      ${inkDeclaration}
      uniform sampler2D density;
      uniform float beamLength;
      uniform float breaks[${mostBreaks}];
      uniform vec2 breakSize;
      uniform float breakGap;
      in vec2 place;
      flat in vec3 look;
      out vec4 color;
      float kink(float x) {
        float k = breakSize.x;
        float a = abs(x);
        float rise = a < 0.5 * k ? 2.0 * a / k : max(0.0, 2.0 - 2.0 * a / k);
        return -sign(x) * rise * breakSize.y;
      }
      void main() {
        float drawn = -place.y;
        if (look.z > 0.5) {
          for (int i = 0; i < ${mostBreaks}; i++) {
            if (breaks[i] > 0.0 && abs(breaks[i] - drawn + kink(place.x) * -1.0) < breakGap) discard;
          }
        }
        int technique = look.x > 0.5 ? 1 : 0;
        float ink = texture(density, vec2(drawn / beamLength, (float(technique) + 0.5) / 2.0)).r;
        vec3 hue = technique == 1 ? inks[${inkNumber(techniqueInkName(1))}] : inks[${inkNumber(techniqueInkName(0))}];
        color = vec4(hue, ink * look.y);
      }`,
  });
}

export function washMesh(
  washes: readonly Wash[],
  material: ShaderMaterial,
  layout: StackLayout,
  density: DataTexture,
): Mesh {
  const { positions, faceOf } = triangles(washes);
  const style = new Float32Array(faceOf.length * 3);
  faceOf.forEach((face, vertex) => {
    const { technique, strength, breaks } = washes[face];
    style.set([technique, strength, breaks ? 1 : 0], 3 * vertex);
  });
  const { uniforms } = material;
  uniforms.density.value = density;
  uniforms.beamLength.value = layout.detector.top;
  uniforms.breaks.value = Array.from(
    { length: mostBreaks },
    (_, i) => layout.shortened[i]?.at ?? 0,
  );
  uniforms.breakSize.value
    .set(breakShape.kink_px, breakShape.rise_px)
    .divideScalar(layout.px_per_mm);
  uniforms.breakGap.value = breakShape.gap_px / layout.px_per_mm;
  const geometry = new BufferGeometry();
  geometry.setAttribute('position', new BufferAttribute(positions, 3));
  geometry.setAttribute('style', new BufferAttribute(style, 3));
  const mesh = new Mesh(geometry, material);
  mesh.frustumCulled = false;
  mesh.renderOrder = 1;
  return mesh;
}
