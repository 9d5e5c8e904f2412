import { describe, expect, test } from 'vitest';
import { stackLabels } from '../../../components/desk/stack-view/stack-labels.js';
import {
  presetNames,
  presetView,
  type StackScene,
  sectionView,
  stackLayout,
  turned,
} from '../../../scenes/index.js';
import { sampleScene } from '../../scenes/sample.js';

const layout = stackLayout(sampleScene, 440, 640);
const thin: StackScene = {
  ...sampleScene,
  layers: Array.from({ length: 12 }, (_, i) => ({
    name: `layer ${i + 1}`,
    material: 'soft tissue',
    family: 'soft tissue',
    thickness_mm: i < 6 ? 2 : 30,
  })),
};

describe('labels beside the stack', () => {
  test('name every layer with material and thickness, the detail, grid, gap and detector', () => {
    const words = stackLabels(sampleScene, layout, sectionView).map((label) => label.words);
    expect(words).toEqual([
      'carbon fibre 2 mm',
      'front, adipose 20 mm',
      'middle, soft tissue 170 mm',
      'back, cortical bone 10 mm',
      'grid 10:1, air gap 100 mm',
      'caesium iodide, 1150 mm from the focal spot',
      '850 mm to the skin',
      '6 mm vessel',
    ]);
  });

  test.each([sampleScene, thin])('never stand on one another, in any view', (scene) => {
    const page = stackLayout(scene, 440, 640);
    const views = [
      ...presetNames.map((name) => presetView(name, page, 6)),
      turned(sectionView, -60, 10),
      turned(sectionView, 20, 65),
    ];
    for (const view of views) {
      const labels = stackLabels(scene, page, view);
      labels.forEach((a, i) => {
        for (const b of labels.slice(i + 1)) {
          const apart = Math.abs(a.top - b.top) >= 17 - 1e-9;
          const [first, second] = a.left < b.left ? [a, b] : [b, a];
          const beside = first.left + first.width <= second.left;
          expect(apart || beside, `${a.words} on ${b.words}`).toBe(true);
        }
      });
    }
  });

  test('a label moved away from a thin layer leads back to it', () => {
    const labels = stackLabels(thin, stackLayout(thin, 440, 640), sectionView);
    expect(
      labels.filter(({ id, leads }) => id.startsWith('layer') && leads).length,
    ).toBeGreaterThan(0);
  });

  test('seen along the beam, layers lie behind one another and are not named', () => {
    expect(stackLabels(sampleScene, layout, turned(sectionView, 0, 90))).toEqual([]);
  });
});
