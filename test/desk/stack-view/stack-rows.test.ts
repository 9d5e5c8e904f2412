import { describe, expect, test } from 'vitest';
import { stackRows } from '../../../components/desk/stack-view/stack-rows.js';
import { stackWords } from '../../../components/desk/stack-view/stack-words.js';
import { raisedPower } from '../../../components/desk/stack-view/tick-text.js';
import { trackWords } from '../../../components/desk/stack-view/track-words.js';
import { sampleScene, sampleTracks } from '../../scenes/sample.js';

describe('the stack as a table', () => {
  const rows = stackRows(sampleScene);

  test('has everything in the order of the beam, the detail inside its layer', () => {
    expect(rows.map((row) => row.name)).toEqual([
      'support',
      'front',
      'middle',
      'detail',
      'back',
      'detector',
    ]);
  });

  test('gives depths below the skin, negative above it', () => {
    expect(rows.map((row) => row.depth_mm)).toEqual([-2, 0, 20, 105, 190, 300]);
    expect(rows.map((row) => row.thickness_mm)).toEqual([2, 20, 170, 6, 10, null]);
  });

  test('gives the primary reaching each face for both techniques', () => {
    const middle = rows[2];
    // The sample's beam at 20 mm depth: start × e^(−0.02·20) × (850/870)².
    const share = Math.exp(-0.4) * (850 / 870) ** 2;
    expect(middle.primary[0]).toBeCloseTo(6e6 * share, -4);
    expect(middle.primary[1]).toBeCloseTo(3e6 * share, -4);
  });

  test('says nothing where nothing is known', () => {
    const unknown = { ...sampleScene.primary, perTechnique: [null, null] };
    const [first] = stackRows({ ...sampleScene, primary: unknown });
    expect(first.primary).toEqual([null, null]);
  });

  test('adds the chosen quantity in the middle of each layer', () => {
    const shading = {
      ...sampleScene.primary,
      scale: 'linear' as const,
      perTechnique: [{ depths_mm: [0, 200], values: [0, 200] }, null],
    };
    const chosen = stackRows({ ...sampleScene, shading }).map((row) => row.chosen);
    expect(chosen[1]).toEqual([10, null]);
    expect(chosen[2]).toEqual([105, null]);
  });
});

describe('the drawing in words', () => {
  test('names layers, detail and whose half is whose', () => {
    expect(stackWords(sampleScene)).toBe(
      'Stack in the beam, cut open along the axis, from focal spot to detector: front (adipose, 20.0 mm), middle (soft tissue, 170 mm), back (cortical bone, 10.0 mm). Detail: 6 mm vessel, 105 mm deep. Current in the left half of the beam, Proposed in the right.',
    );
  });

  test('counts photon tracks by interaction', () => {
    expect(trackWords(sampleScene, sampleTracks)).toBe(
      'Photon paths of Proposed: 1 primary (thin line), 1 after Compton scatter (line), 1 after Rayleigh scatter (dotted), 1 ends by absorption (dot).',
    );
  });

  test('powers of ten stand raised where they are long', () => {
    expect([1e-5, 0.01, 1, 100, 1e6].map(raisedPower)).toEqual(['10⁻⁵', '0.01', '1', '100', '10⁶']);
  });
});
