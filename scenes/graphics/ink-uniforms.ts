import { type IUniform, Vector2, Vector3 } from 'three';
import { inkNames, rgbOf, type StackInks } from '../inks.js';

/** What every shader of a picture shares: inks and the size of its page. */
export interface PageUniforms {
  readonly inks: IUniform<Vector3[]>;
  /** Device pixels a px. */
  readonly pixelRatio: IUniform<number>;
  /** Half the page in device pixels. */
  readonly halfPage: IUniform<Vector2>;
}

export const pageUniforms = (): PageUniforms => ({
  inks: { value: inkNames.map(() => new Vector3()) },
  pixelRatio: { value: 1 },
  halfPage: { value: new Vector2(1, 1) },
});

export function setInks(uniforms: PageUniforms, inks: StackInks): void {
  inkNames.forEach((name, i) => {
    uniforms.inks.value[i].set(...rgbOf(inks[name]));
  });
}

/** Declares the inks in a shader. */
export const inkDeclaration = `uniform vec3 inks[${inkNames.length}];`;
