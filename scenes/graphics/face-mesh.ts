import { BufferAttribute, BufferGeometry, DoubleSide, GLSL3, Mesh, ShaderMaterial } from 'three';
import type { Face } from '../drawing/drawing.js';
import { inkNumber } from '../inks.js';
import { hatchNumber, hatchShader } from './hatch.glsl.js';
import { inkDeclaration, type PageUniforms } from './ink-uniforms.js';
import { triangles } from './triangles.js';

/** Opaque flat faces, unlit: paper with a hatch in ink. All faces of a drawing are one mesh. */
export function faceMaterial(uniforms: PageUniforms, over: boolean): ShaderMaterial {
  return new ShaderMaterial({
    glslVersion: GLSL3,
    side: DoubleSide,
    depthTest: !over,
    transparent: over,
    uniforms: { ...uniforms, scale: { value: 1 } },
    vertexShader: /* glsl */ `
      in vec3 style;
      uniform float scale;
      out vec2 place;
      flat out ivec3 look;
      void main() {
        place = position.xy * scale;
        look = ivec3(style + 0.5);
        gl_Position = projectionMatrix * vec4(position, 1.0);
      }`,
    fragmentShader: /* glsl */ `
      ${inkDeclaration}
      ${hatchShader}
      in vec2 place;
      flat in ivec3 look;
      out vec4 color;
      void main() {
        color = vec4(mix(inks[look.x], inks[look.z], hatch(look.y, place)), 1.0);
      }`,
  });
}

export function faceMesh(
  faces: readonly Face[],
  material: ShaderMaterial,
  px_per_mm: number,
  order: number,
): Mesh {
  const { positions, faceOf } = triangles(faces);
  const style = new Float32Array(faceOf.length * 3);
  faceOf.forEach((face, vertex) => {
    const { fill, hatch, hatchInk } = faces[face];
    style.set([inkNumber(fill), hatchNumber(hatch), inkNumber(hatchInk ?? 'ink')], 3 * vertex);
  });
  material.uniforms.scale.value = px_per_mm;
  const geometry = new BufferGeometry();
  geometry.setAttribute('position', new BufferAttribute(positions, 3));
  geometry.setAttribute('style', new BufferAttribute(style, 3));
  const mesh = new Mesh(geometry, material);
  mesh.frustumCulled = false;
  mesh.renderOrder = order;
  return mesh;
}
