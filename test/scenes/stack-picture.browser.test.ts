import { expect } from 'chai';
import { lightInks } from '../../scenes/inks.js';
import { stackLayout } from '../../scenes/stack-layout.js';
import { type StackPicture, stackPicture } from '../../scenes/stack-picture.js';
import { sectionView, turned } from '../../scenes/view.js';
import { sampleScene, sampleTracks } from './sample.js';

const layout = stackLayout(sampleScene, 300, 400);
const frame = () => new Promise((done) => requestAnimationFrame(done));
const rest = (ms: number) => new Promise((done) => setTimeout(done, ms));

describe('the stack in three dimensions', () => {
  let canvas: HTMLCanvasElement;
  let picture: StackPicture;

  beforeEach(() => {
    canvas = document.createElement('canvas');
    document.body.append(canvas);
    const made = stackPicture(canvas, lightInks);
    if (!made) throw new Error('this browser has no WebGL2');
    picture = made;
  });

  afterEach(() => {
    picture.dispose();
    canvas.remove();
  });

  /** Red, green, blue, opacity of the page at a place in px, in the frame just drawn. */
  function pixel(x: number, y: number): number[] {
    const gl = canvas.getContext('webgl2') as WebGL2RenderingContext;
    const ratio = canvas.width / layout.width_px;
    const out = new Uint8Array(4);
    gl.readPixels(
      Math.round(x * ratio),
      Math.round(canvas.height - y * ratio),
      1,
      1,
      gl.RGBA,
      gl.UNSIGNED_BYTE,
      out,
    );
    return [...out];
  }

  it('inks the left half of the beam in graphite and the right in madder', async () => {
    picture.show(sampleScene, layout);
    await frame();
    const y = layout.origin_px.y + (layout.skin + 60) * layout.px_per_mm;
    const at = (mm: number) => pixel(layout.origin_px.x + mm * layout.px_per_mm, y);
    const [graphite, madder] = [at(-37), at(37)];
    expect(graphite[3]).to.equal(255);
    // Madder has far more red than green; graphite has them nearly alike.
    expect(madder[0] - madder[1]).to.be.greaterThan(25);
    expect(Math.abs(graphite[0] - graphite[1])).to.be.lessThan(15);
    expect(graphite[0]).to.be.lessThan(230);
  });

  it('leaves the paper outside the stack untouched', async () => {
    picture.show(sampleScene, layout);
    await frame();
    expect(pixel(3, 3)[3]).to.equal(0);
  });

  it('takes one frame for any number of changes, and none at rest', async () => {
    picture.show(sampleScene, layout);
    picture.look(turned(sectionView, 10, 0));
    picture.look(turned(sectionView, 20, 0));
    picture.ink(lightInks);
    await frame();
    expect(picture.frames()).to.equal(1);
    await rest(400);
    expect(picture.frames()).to.equal(1);
    picture.look(sectionView);
    await frame();
    expect(picture.frames()).to.equal(2);
  });

  it('holds no more after many scenes than after one', async () => {
    picture.show({ ...sampleScene, tracks: sampleTracks }, layout);
    await frame();
    const once = picture.holdings();
    for (let i = 0; i < 5; i += 1) {
      picture.show({ ...sampleScene, tracks: sampleTracks }, layout);
      await frame();
    }
    expect(picture.holdings()).to.deep.equal(once);
  });

  it('leaves nothing on the graphics card when it is disposed of', async () => {
    picture.show({ ...sampleScene, tracks: sampleTracks }, layout);
    await frame();
    expect(picture.holdings().geometries).to.be.greaterThan(0);
    picture.dispose();
    expect(picture.holdings()).to.deep.equal({ geometries: 0, textures: 0, programs: 0 });
    expect(canvas.getContext('webgl2')?.isContextLost()).to.equal(true);
  });

  it('draws tracks over everything', async () => {
    picture.show(sampleScene, layout);
    await frame();
    const x = layout.origin_px.x + 62 * layout.px_per_mm;
    const y = layout.origin_px.y + (layout.skin + 120) * layout.px_per_mm;
    // The absorbed point of the sample lies 22 mm behind the cut face.
    const [dx, dy] = [0.38 * 22 * layout.px_per_mm, 0.17 * 22 * layout.px_per_mm];
    const before = pixel(x + dx, y - dy);
    picture.show({ ...sampleScene, tracks: sampleTracks }, layout);
    await frame();
    const after = pixel(x + dx, y - dy);
    expect(after[1]).to.be.lessThan(before[1] - 60);
  });
});
