import 'axe-core';
import type { AxeResults } from 'axe-core';
import { expect } from 'chai';
import type { StackView } from '../../../components/desk/stack-view/stack-view.js';
import '../../../components/desk/stack-view/stack-view.js';
import { valueAt } from '../../../scenes/ink-scale.js';
import { darkInks, lightInks, type StackInks } from '../../../scenes/inks.js';
import type { StackAnchors } from '../../../scenes/stack-anchors.js';
import { sampleScene, sampleTracks } from '../../scenes/sample.js';

declare const axe: { run: (node: Element) => Promise<AxeResults> };

const rest = (ms: number) => new Promise((done) => setTimeout(done, ms));

/** Waits until something holds; the test's own time limit ends a wait in vain. */
async function until(holds: () => boolean): Promise<void> {
  while (!holds()) await rest(15);
}

/** The page's paper and inks, as the desk sets them. */
function setPaper(inks: StackInks): void {
  const page = document.documentElement.style;
  page.background = inks.paper;
  const names = {
    paper: 'paper',
    'paper-shade': 'shade',
    ink: 'ink',
    soft: 'soft',
    rule: 'rule',
    graphite: 'current',
    madder: 'proposed',
  } as const;
  for (const [name, ink] of Object.entries(names)) page.setProperty(`--${name}`, inks[ink]);
}

describe('stack-view', () => {
  let element: StackView;
  let anchors: StackAnchors[];
  let turns: boolean[];

  const inside = <E extends Element = HTMLElement>(selector: string): E =>
    element.shadowRoot?.querySelector(selector) as E;
  const key = (name: string, more: KeyboardEventInit = {}) =>
    inside('.stage').dispatchEvent(
      new KeyboardEvent('keydown', { key: name, bubbles: true, cancelable: true, ...more }),
    );
  const seen = () => inside('.from')?.textContent ?? '';
  const isSolid = () => inside('.stage')?.classList.contains('solid');

  beforeEach(async () => {
    setPaper(lightInks);
    anchors = [];
    turns = [];
    element = document.createElement('stack-view');
    element.style.cssText = 'width:440px;height:640px';
    element.addEventListener('stack-anchors', ({ detail }) => anchors.push(detail));
    element.addEventListener('view-turned', ({ detail }) => turns.push(detail));
    element.scene = sampleScene;
    document.body.append(element);
    await until(() => isSolid() && element.frames > 0);
  });

  afterEach(() => element.remove());

  it('tells once where things stand, from the focal spot down', () => {
    expect(anchors).to.have.length(1);
    const [at] = anchors;
    const heights = [
      at.source,
      at.filter,
      at.skin,
      ...at.layers.map((layer) => layer.centre),
      at.exit,
      at.grid?.top ?? 0,
      at.detector.top,
    ];
    expect([...heights].sort((a, b) => a - b)).to.deep.equal(heights);
    expect(at.detail).to.be.within(at.layers[1].top, at.layers[1].bottom);
  });

  it('says nothing new for a scene that stands alike', async () => {
    element.scene = { ...sampleScene };
    await element.updateComplete;
    expect(anchors).to.have.length(1);
    element.style.height = '700px';
    await until(() => anchors.length === 2);
    expect(anchors[1].detector.top).to.be.greaterThan(anchors[0].detector.top);
  });

  it('takes no frames at rest', async () => {
    await rest(100);
    const { frames } = element;
    await rest(400);
    expect(element.frames).to.equal(frames);
  });

  it('turns by arrow keys, one frame a change, and goes home', async () => {
    await rest(100);
    const { frames } = element;
    key('ArrowRight');
    key('ArrowUp');
    await until(() => element.frames > frames);
    expect(seen()).to.equal('from 5° right, 5° above');
    expect(turns).to.deep.equal([true]);
    key('Home');
    await until(() => turns.length === 2);
    expect(turns).to.deep.equal([true, false]);
    await element.updateComplete;
    expect(seen()).to.equal('');
  });

  it('zooms by plus and minus and leaves the browser its own keys', async () => {
    key('+');
    await element.updateComplete;
    expect(seen()).to.contain('1.2 times as large');
    key('-');
    await element.updateComplete;
    expect(seen()).to.equal('');
    expect(key('+', { ctrlKey: true })).to.equal(true);
    expect(key('+')).to.equal(false);
  });

  it('goes to the view under a number and announces it', async () => {
    key('3');
    await until(() => inside('[role=status]').textContent !== '');
    expect(inside('[role=status]').textContent).to.match(/^Seen from 38° right, 24° above/);
    const pressed = [...(element.shadowRoot?.querySelectorAll('[aria-pressed=true]') ?? [])];
    expect(pressed.map((button) => button.textContent)).to.deep.equal(['right']);
  });

  it('turns by dragging', async () => {
    const stage = inside('.stage');
    const at = (type: string, clientX: number, clientY: number) =>
      stage.dispatchEvent(
        new PointerEvent(type, { clientX, clientY, pointerId: 1, buttons: 1, bubbles: true }),
      );
    stage.setPointerCapture = () => undefined;
    at('pointerdown', 100, 100);
    at('pointermove', 50, 125);
    at('pointerup', 50, 125);
    at('pointermove', 0, 0);
    await element.updateComplete;
    expect(seen()).to.equal('from 20° right, 10° above');
  });

  it('leaves the wheel to the page until it has focus', () => {
    const wheel = () => new WheelEvent('wheel', { deltaY: -100, cancelable: true });
    expect(inside('.stage').dispatchEvent(wheel())).to.equal(true);
    inside('.stage').focus();
    expect(inside('.stage').dispatchEvent(wheel())).to.equal(false);
  });

  it('has a table that says what the drawing shows', () => {
    const rows = [...(element.shadowRoot?.querySelectorAll('tbody tr') ?? [])].map((row) =>
      [...row.children].map((cell) => cell.textContent?.trim() ?? ''),
    );
    expect(rows.map(([name]) => name)).to.deep.equal([
      'support',
      'front',
      'middle',
      'detail',
      'back',
      'detector',
    ]);
    const number = (text: string) => {
      const [mantissa, power] = text.split(' × 10');
      const raised = [...(power ?? '⁰')].map((digit) => '⁰¹²³⁴⁵⁶⁷⁸⁹'.indexOf(digit)).join('');
      return Number(mantissa) * 10 ** Number(raised);
    };
    for (const [, , , depth, current, proposed] of rows.slice(1)) {
      [current, proposed].forEach((text, i) => {
        const profile = sampleScene.primary.perTechnique[i];
        const value = profile && valueAt(profile, Number(depth));
        expect(number(text) / (value ?? 0)).to.be.closeTo(1, 0.005);
      });
    }
  });

  it('draws another view when the page asks for one', async () => {
    element.view = 'front';
    await until(() => turns.length > 0);
    await rest(400);
    expect(seen()).to.match(/^from the front/);
  });

  it('frees everything when it leaves the page and draws again when it is back', async () => {
    const canvas = inside<HTMLCanvasElement>('canvas');
    element.remove();
    expect(canvas.getContext('webgl2')?.isContextLost()).to.equal(true);
    expect(inside('canvas')).to.equal(null);
    document.body.append(element);
    await until(() => isSolid() && element.frames > 0);
    expect(element.shadowRoot?.querySelectorAll('canvas')).to.have.length(1);
  });

  it('falls back to the flat section while the graphics card has dropped it', async () => {
    const lose = inside<HTMLCanvasElement>('canvas')
      .getContext('webgl2')
      ?.getExtension('WEBGL_lose_context');
    lose?.loseContext();
    await until(() => !isSolid());
    expect(getComputedStyle(inside('.section')).display).to.equal('block');
    lose?.restoreContext();
    await until(() => isSolid() && element.frames > 0);
    expect(getComputedStyle(inside('.section')).display).to.equal('none');
  });

  it('is the flat section where there is no WebGL2, and still tells its places; keys are left to the browser', async () => {
    element.remove();
    const { getContext } = HTMLCanvasElement.prototype;
    HTMLCanvasElement.prototype.getContext = () => null;
    try {
      element = document.createElement('stack-view');
      element.style.cssText = 'width:440px;height:640px';
      element.addEventListener('stack-anchors', ({ detail }) => anchors.push(detail));
      element.scene = sampleScene;
      document.body.append(element);
      await until(() => anchors.length === 2);
      await rest(200);
      expect(isSolid()).to.equal(false);
      expect(inside('.section').querySelectorAll('.layer')).to.have.length(3);
      const [label] = element.shadowRoot?.querySelectorAll<HTMLElement>('.label') ?? [];
      const { left, top } = label.style;
      expect(key('3')).to.equal(true);
      await rest(50);
      expect([label.style.left, label.style.top]).to.deep.equal([left, top]);
      expect(inside<HTMLButtonElement>('.views button').disabled).to.equal(true);
    } finally {
      HTMLCanvasElement.prototype.getContext = getContext;
    }
  });

  it('shows own labels only when turned where the page has its own', async () => {
    element.labels = 'turned';
    await element.updateComplete;
    expect(inside('.label')).to.equal(null);
    key('ArrowLeft');
    await element.updateComplete;
    expect(inside('.label').textContent).to.equal('carbon fibre 2 mm');
  });

  it('inks another quantity when it is chosen, and says so in the table', async () => {
    const energy = {
      quantity: 'energy absorbed per depth',
      unit: 'mJ/cm',
      scale: 'linear' as const,
      extent: 'body' as const,
      perTechnique: [{ depths_mm: [0, 200], values: [2, 1] }, null],
    };
    expect(inside('select')).to.equal(null);
    element.shadings = [energy];
    await element.updateComplete;
    const choice = inside<HTMLSelectElement>('select');
    expect([...choice.options].map((option) => option.text.trim())).to.deep.equal([
      'primary photons, per mm² and frame',
      'energy absorbed per depth, mJ/cm',
    ]);
    const { frames } = element;
    choice.value = energy.quantity;
    choice.dispatchEvent(new Event('change'));
    await until(() => element.frames > frames);
    const [support, front] = element.shadowRoot?.querySelectorAll('tbody tr') ?? [];
    expect(support.children[6].textContent).to.equal('–');
    // 10 of 200 mm on the way from 2 to 1, in equal ratios: 2 · 2^(−1/20).
    expect(front.children[6].textContent).to.equal('1.93');
  });

  it('tells of photon tracks in words', async () => {
    element.scene = { ...sampleScene, tracks: sampleTracks };
    await element.updateComplete;
    expect(inside('.sheet p').textContent).to.contain('1 after Rayleigh scatter');
  });

  for (const [paper, inks] of [
    ['light', lightInks],
    ['dark', darkInks],
  ] as const) {
    it(`has no accessibility faults on ${paper} paper, with the table open`, async () => {
      setPaper(inks);
      inside<HTMLDetailsElement>('details').open = true;
      const { violations } = await axe.run(element);
      expect(
        violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' ')}`),
      ).to.deep.equal([]);
    });
  }
});
