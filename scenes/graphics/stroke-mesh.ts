import {
  BufferAttribute,
  GLSL3,
  InstancedBufferAttribute,
  InstancedBufferGeometry,
  Mesh,
  ShaderMaterial,
} from 'three';
import type { Stroke } from '../drawing/drawing.js';
import { inkNumber } from '../inks.js';
import { inkDeclaration, type PageUniforms } from './ink-uniforms.js';

/**
 * Pen strokes of a width on the page, with dashes and round ends: a rectangle a stroke, laid along
 * it by the graphics card. (The card's own lines are one device pixel wide, too thin on fine screens.)
 */
export function strokeMaterial(uniforms: PageUniforms, over: boolean): ShaderMaterial {
  return new ShaderMaterial({
    glslVersion: GLSL3,
    transparent: true,
    depthWrite: false,
    depthTest: !over,
    uniforms: { ...uniforms },
    vertexShader: /* glsl */ `
      in vec3 start;
      in vec3 end;
      in vec4 pen;
      in float ink;
      uniform float pixelRatio;
      uniform vec2 halfPage;
      out vec2 place;
      flat out vec4 stroke;
      flat out vec2 dash;
      flat out int hue;
      void main() {
        vec4 a = projectionMatrix * vec4(start, 1.0);
        vec4 b = projectionMatrix * vec4(end, 1.0);
        vec2 pa = a.xy * halfPage;
        vec2 pb = b.xy * halfPage;
        float run = length(pb - pa);
        vec2 forward = run > 0.001 ? (pb - pa) / run : vec2(1.0, 0.0);
        float radius = 0.5 * max(1.0, pen.x * pixelRatio);
        float pad = radius + 1.0;
        bool atEnd = position.x > 0.0;
        place = vec2(atEnd ? run + pad : -pad, position.y * pad);
        vec2 at = (atEnd ? pb : pa) + forward * position.x * pad + vec2(-forward.y, forward.x) * place.y;
        stroke = vec4(run, radius, min(1.0, pen.x * pixelRatio) * pen.w, 0.0);
        dash = pen.yz * pixelRatio;
        hue = int(ink + 0.5);
        gl_Position = vec4(at / halfPage, (atEnd ? b.z : a.z) - 0.0015, 1.0);
      }`,
    fragmentShader: /* glsl */ `
      ${inkDeclaration}
      in vec2 place;
      flat in vec4 stroke;
      flat in vec2 dash;
      flat in int hue;
      out vec4 color;
      void main() {
        float beyond = max(0.0, max(-place.x, place.x - stroke.x));
        float cover = clamp(0.5 + stroke.y - length(vec2(beyond, place.y)), 0.0, 1.0);
        if (dash.x > 0.0) {
          float t = mod(place.x, dash.x + dash.y);
          cover *= clamp(0.5 + min(t, dash.x - t) + 0.25, 0.0, 1.0);
        }
        if (cover <= 0.0) discard;
        color = vec4(inks[hue], cover * stroke.z);
      }`,
  });
}

const corners = new Float32Array([-1, -1, 0, 1, -1, 0, 1, 1, 0, -1, 1, 0]);

export function strokeMesh(
  strokes: readonly Stroke[],
  material: ShaderMaterial,
  order: number,
): Mesh {
  const start = new Float32Array(strokes.length * 3);
  const end = new Float32Array(strokes.length * 3);
  const pen = new Float32Array(strokes.length * 4);
  const ink = new Float32Array(strokes.length);
  strokes.forEach((stroke, i) => {
    start.set(stroke.from, 3 * i);
    end.set(stroke.to, 3 * i);
    const [on, off] = stroke.pen.dash ?? [0, 0];
    pen.set([stroke.pen.width_px, on, off, stroke.pen.opacity], 4 * i);
    ink[i] = inkNumber(stroke.pen.ink);
  });
  const geometry = new InstancedBufferGeometry();
  geometry.setAttribute('position', new BufferAttribute(corners, 3));
  geometry.setIndex([0, 1, 2, 0, 2, 3]);
  geometry.setAttribute('start', new InstancedBufferAttribute(start, 3));
  geometry.setAttribute('end', new InstancedBufferAttribute(end, 3));
  geometry.setAttribute('pen', new InstancedBufferAttribute(pen, 4));
  geometry.setAttribute('ink', new InstancedBufferAttribute(ink, 1));
  geometry.instanceCount = strokes.length;
  const mesh = new Mesh(geometry, material);
  mesh.frustumCulled = false;
  mesh.renderOrder = order;
  return mesh;
}
