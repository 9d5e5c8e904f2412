import { type Mesh, OrthographicCamera, Scene, WebGLRenderer } from 'three';
import { densityRows } from './density-rows.js';
import { shownShading, stackDrawing } from './drawing/stack-drawing.js';
import { trackStrokes } from './drawing/track-strokes.js';
import { densityTexture } from './graphics/density-texture.js';
import { faceMaterial, faceMesh } from './graphics/face-mesh.js';
import { pageUniforms, setInks } from './graphics/ink-uniforms.js';
import { strokeMaterial, strokeMesh } from './graphics/stroke-mesh.js';
import { washMaterial, washMesh } from './graphics/wash-mesh.js';
import type { StackInks } from './inks.js';
import { clipMatrix, projection } from './projection.js';
import type { StackLayout } from './stack-layout.js';
import type { StackScene } from './stack-scene-data.js';
import { sectionView, type View } from './view.js';

/** What the graphics card holds for a picture. */
export interface PictureHoldings {
  readonly geometries: number;
  readonly textures: number;
  readonly programs: number;
}

/** A stack drawn on one canvas. Nothing is drawn at rest: every change asks for a single frame. */
export interface StackPicture {
  /** Draws another scene or the same at another size. */
  readonly show: (scene: StackScene, layout: StackLayout) => void;
  readonly look: (view: View) => void;
  readonly ink: (inks: StackInks) => void;
  /** Frames drawn so far. */
  readonly frames: () => number;
  readonly holdings: () => PictureHoldings;
  /** Frees everything; the picture cannot be used afterwards. */
  readonly dispose: () => void;
}

const finest = 2;

/**
 * Prepares a canvas.
 * @returns null where there is no WebGL2.
 */
export function stackPicture(canvas: HTMLCanvasElement, inks: StackInks): StackPicture | null {
  const context = canvas.getContext('webgl2', { alpha: true, antialias: true, depth: true });
  if (!context || context.isContextLost()) return null;
  const renderer = new WebGLRenderer({ canvas, context });
  renderer.setClearColor(0, 0);
  const uniforms = pageUniforms();
  setInks(uniforms, inks);
  const materials = {
    faces: faceMaterial(uniforms, false),
    facesOver: faceMaterial(uniforms, true),
    washes: washMaterial(uniforms),
    strokes: strokeMaterial(uniforms, false),
    over: strokeMaterial(uniforms, true),
  };
  const scene = new Scene();
  const camera = new OrthographicCamera();
  camera.matrixAutoUpdate = false;
  let shown: StackLayout | null = null;
  let view: View = sectionView;
  let waiting = 0;
  let drawn = 0;

  const clear = () => {
    for (const child of [...scene.children]) {
      scene.remove(child);
      (child as Mesh).geometry.dispose();
    }
    materials.washes.uniforms.density.value?.dispose();
    materials.washes.uniforms.density.value = null;
  };

  const draw = () => {
    waiting = 0;
    if (!shown) return;
    const { width_px, height_px, detector, body } = shown;
    const reach_mm = 2 * (detector.bottom + body.halfWidth + body.depth);
    const matrix = clipMatrix(projection(view, shown), width_px, height_px, reach_mm);
    camera.projectionMatrix.fromArray(matrix);
    camera.projectionMatrixInverse.copy(camera.projectionMatrix).invert();
    renderer.render(scene, camera);
    drawn += 1;
  };
  const ask = () => {
    if (waiting === 0) waiting = requestAnimationFrame(draw);
  };

  return {
    show: (data, layout) => {
      clear();
      shown = layout;
      const ratio = Math.min(finest, globalThis.devicePixelRatio || 1);
      renderer.setPixelRatio(ratio);
      renderer.setSize(layout.width_px, layout.height_px, false);
      uniforms.pixelRatio.value = ratio;
      uniforms.halfPage.value.set((layout.width_px * ratio) / 2, (layout.height_px * ratio) / 2);
      const parts = stackDrawing(data, layout);
      const ink = densityTexture(densityRows(data, layout, shownShading(data)));
      const tracks = data.tracks ? trackStrokes(data.tracks, layout, data.sourceToSkin_mm) : [];
      const isOver = ({ over = false }: { readonly over?: boolean }) => over;
      const strokesOver = parts.strokes.filter(({ pen }) => isOver(pen));
      scene.add(
        faceMesh(
          parts.faces.filter((face) => !isOver(face)),
          materials.faces,
          layout.px_per_mm,
          0,
        ),
        washMesh(parts.washes, materials.washes, layout, ink),
        strokeMesh(
          parts.strokes.filter(({ pen }) => !isOver(pen)),
          materials.strokes,
          2,
        ),
        strokeMesh([...strokesOver, ...tracks], materials.over, 3),
        faceMesh(parts.faces.filter(isOver), materials.facesOver, layout.px_per_mm, 4),
      );
      ask();
    },
    look: (next) => {
      view = next;
      ask();
    },
    ink: (next) => {
      setInks(uniforms, next);
      ask();
    },
    frames: () => drawn,
    holdings: () => ({
      geometries: renderer.info.memory.geometries,
      textures: renderer.info.memory.textures,
      programs: renderer.info.programs?.length ?? 0,
    }),
    dispose: () => {
      cancelAnimationFrame(waiting);
      clear();
      for (const material of Object.values(materials)) material.dispose();
      renderer.dispose();
      renderer.forceContextLoss();
      shown = null;
    },
  };
}
