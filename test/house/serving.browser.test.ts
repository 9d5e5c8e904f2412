import { expect } from 'chai';
import { Matrix, solve } from 'ml-matrix';
import { WebGLRenderer } from 'three';
import { DecoratedElement } from './decorated-element.js';

describe('the page the component tests run in', () => {
  it('renders a decorated element again when a property changes', async () => {
    const element = new DecoratedElement();
    document.body.append(element);
    await element.updateComplete;
    expect(element.shadowRoot?.textContent).to.contain('1 mm');
    element.thickness_mm = 3;
    await element.updateComplete;
    expect(element.shadowRoot?.textContent).to.contain('3 mm');
    element.remove();
  });

  it('imports packages that are CommonJS inside', () => {
    const solution = solve(
      new Matrix([
        [2, 0],
        [0, 4],
      ]),
      Matrix.columnVector([2, 8]),
    );
    expect(solution.to1DArray()).to.deep.equal([1, 2]);
  });

  it('has WebGL2 without a graphics card', () => {
    const renderer = new WebGLRenderer();
    expect(renderer.getContext()).to.be.instanceOf(WebGL2RenderingContext);
    renderer.dispose();
  });
});
