import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { growthShares, placeStack, sizesOf } from '../../../physics/stack/index.js';
import { abdomen, refusals, stackIn } from './abdomen.js';

const layer = (name: string, thickness_mm: number, growthShare: number | null = null) => ({
  name,
  material: 'soft tissue',
  thickness_mm,
  growthShare,
  agent: null,
});

describe('the sizes of a patient', () => {
  it('are one, the layers as drawn, when none is given', () => {
    expect(sizesOf(abdomen().patient)).toEqual([
      { name: 'as drawn', thickness_mm: 202, weight: 1 },
    ]);
  });

  it('are those entered otherwise', () => {
    const sizes = [{ name: 'large', thickness_mm: 280, weight: 0.2 }];
    expect(sizesOf(abdomen({ sizes }).patient)).toEqual(sizes);
  });
});

describe('growth', () => {
  it('gives each layer its share: tᵢ(T) = tᵢ + gᵢ(T − Σt)', () => {
    const { layers, thickness_mm } = stackIn(abdomen(), 252);
    expect(layers.map((each) => each.thickness_mm)).toEqual([35, 205, 12]);
    expect(thickness_mm).toBe(252);
  });

  it('without shares scales every layer alike', () => {
    expect(growthShares([layer('a', 30), layer('b', 90)])).toEqual([0.25, 0.75]);
  });

  it('divides what entered shares leave among the rest in proportion to thickness', () => {
    const shares = growthShares([layer('a', 30), layer('b', 90), layer('c', 50, 0.2)]);
    expect(shares?.map((share) => Number(share.toFixed(12)))).toEqual([0.2, 0.6, 0.2]);
  });

  it('is refused when entered shares do not sum to 1', () => {
    expect(growthShares([layer('a', 30, 0.5), layer('b', 90, 0.2)])).toBeNull();
    expect(growthShares([layer('a', 30, 0.9), layer('b', 90, 0.2)])).toBeNull();
    const c = abdomen({ layers: [layer('abdomen', 100, 0.5), layer('b', 90, 0.2)] });
    expect(refusals(placeStack(c, sizesOf(c.patient)[0]))[0].code).toBe('growthShares');
  });

  it('keeps the patient as thick as asked, whatever the shares', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 1, noNaN: true }),
        fc.double({ min: 60, max: 400, noNaN: true }),
        (share, thickness_mm) => {
          const c = abdomen({
            layers: [layer('abdomen', 100, share), layer('b', 100, 1 - share)],
            detail: { shape: 'slab', inLayer: 'abdomen', size_mm: 1, material: 'blood' },
          });
          const placed = placeStack(c, { name: 'drawn by lot', thickness_mm, weight: 1 });
          if (!('layers' in placed)) return;
          const sum = placed.layers.reduce((total, each) => total + each.thickness_mm, 0);
          expect(sum).toBeCloseTo(thickness_mm, 9);
        },
      ),
    );
  });

  it('that would make a layer vanish is a finding, not a negative thickness', () => {
    const c = abdomen();
    const [finding] = refusals(placeStack(c, { name: 'small', thickness_mm: 100, weight: 1 }));
    expect(finding).toMatchObject({
      code: 'layerVanishes',
      severity: 'limit',
      path: 'patient.layers[0].growthShare',
    });
  });
});

describe('the anchor', () => {
  const withAnchor = (anchor: string) =>
    abdomen({ room: { geometry: { sourceToDetector_mm: 1150, exitToDetector_mm: 100, anchor } } });

  it.each([
    ['detector', 100, 798],
    ['table', 50, 848],
    ['isocentre', 75, 823],
  ] as const)('%s: a patient 50 mm thicker', (anchor, exitToDetector_mm, sourceToSkin_mm) => {
    expect(stackIn(withAnchor(anchor), 252)).toMatchObject({ exitToDetector_mm, sourceToSkin_mm });
    expect(stackIn(withAnchor(anchor))).toMatchObject({
      exitToDetector_mm: 100,
      sourceToSkin_mm: 848,
    });
  });

  it('leaves source, patient and detector adding up', () => {
    for (const anchor of ['detector', 'table', 'isocentre']) {
      const stack = stackIn(withAnchor(anchor), 231);
      expect(stack.sourceToSkin_mm + stack.thickness_mm + stack.exitToDetector_mm).toBeCloseTo(
        stack.sourceToDetector_mm,
        9,
      );
    }
  });

  it('that leaves a negative gap is a finding with the gap as value', () => {
    const c = withAnchor('table');
    expect(refusals(placeStack(c, { name: 'large', thickness_mm: 320, weight: 1 }))).toMatchObject([
      { code: 'gapNegative', severity: 'limit', value: -18, bound: 0 },
    ]);
  });

  it('leaves room for support at the exit, or says so', () => {
    const support = [{ material: 'carbon fibre', thickness_mm: 5, side: 'exit' }];
    const geometry = { sourceToDetector_mm: 1150, exitToDetector_mm: 3 };
    const c = abdomen({ room: { geometry, support } });
    expect(refusals(placeStack(c, sizesOf(c.patient)[0]))).toMatchObject([
      { code: 'gapNegative', value: 3, bound: 5 },
    ]);
  });

  it('that puts the source inside the patient is a finding', () => {
    const c = abdomen({ room: { geometry: { sourceToDetector_mm: 250 } } });
    expect(refusals(placeStack(c, sizesOf(c.patient)[0]))).toMatchObject([
      { code: 'sourceInsidePatient' },
    ]);
  });
});

describe('what a stack is made of', () => {
  it('is the same object for the same name, so that coefficients are shared between sizes', () => {
    const c = abdomen({
      materials: [{ name: 'foam', density_g_per_cm3: 0.05, massFractions: { C: 1 } }],
    });
    const small = stackIn(c, 202);
    const large = stackIn({ ...c, title: 'a copy' }, 240);
    small.layers.forEach((each, i) => {
      expect(each.material).toBe(large.layers[i].material);
    });
  });

  it('may be the case’s own material, an element by name or symbol, or an agent in the layer', () => {
    const c = abdomen({
      materials: [{ name: 'foam', density_g_per_cm3: 0.05, massFractions: { C: 0.9, H: 0.1 } }],
      layers: [
        { name: 'pad', material: 'foam', thickness_mm: 10 },
        { name: 'plate', material: 'Cu', thickness_mm: 1 },
        { name: 'sheet', material: 'copper', thickness_mm: 1 },
        {
          name: 'abdomen',
          material: 'water',
          thickness_mm: 50,
          agent: { name: 'barium sulfate', amount: { value: 60, unit: '% w/v' } },
        },
      ],
    });
    const [pad, plate, sheet, contrast] = stackIn(c).layers;
    expect(pad.material.density_g_per_cm3).toBe(0.05);
    expect(plate.material).toBe(sheet.material);
    // Barium sulfate 60 % w/v: ρ = 1 + w(1 − 1/4.5), agents.csv, on water of 1.000 g/cm³.
    expect(contrast.material.density_g_per_cm3).toBeCloseTo(1.467, 2);
  });

  it('puts support on its side of the patient and outside its thickness', () => {
    const support = [
      { material: 'carbon fibre', thickness_mm: 2 },
      { material: 'pmma', thickness_mm: 3, side: 'exit' },
      { material: 'water', thickness_mm: 0 },
    ];
    const stack = stackIn(abdomen({ room: { geometry: { sourceToDetector_mm: 1150 }, support } }));
    expect(stack.supportEntrance.map(({ name }) => name)).toEqual(['carbon fibre']);
    expect(stack.supportExit.map(({ name }) => name)).toEqual(['pmma']);
    expect(stack.thickness_mm).toBe(202);
  });
});
