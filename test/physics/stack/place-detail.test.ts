import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { detailSchema } from '../../../physics/case/schema.js';
import { detailPaths, detailVolume_mL, placeDetail } from '../../../physics/stack/index.js';
import { abdomen, detailIn, iodine, refusals, stackIn, vessel } from './abdomen.js';

const pathsOf = (entered: object) =>
  detailPaths(detailSchema.parse({ ...vessel, agent: undefined, ...entered }));

describe('the paths through a vessel', () => {
  it('cover its projected area and its volume', () => {
    const paths = pathsOf({ size_mm: 6, length_mm: 10 });
    expect(paths.paths.reduce((sum, { area_mm2 }) => sum + area_mm2, 0)).toBeCloseTo(60, 8);
    expect(detailVolume_mL(paths)).toBeCloseTo((Math.PI * 9 * 10) / 1000, 8);
  });

  it('give L∫c² dx = ⅔ d³ L for a thin signal: central chord times area is √1.5 too much in SdNR', () => {
    const { paths } = pathsOf({ size_mm: 6, length_mm: 10 });
    const integral = paths.reduce((sum, path) => sum + path.area_mm2 * path.detail_mm ** 2, 0);
    expect(integral / ((2 / 3) * 6 ** 3 * 10)).toBeCloseTo(1, 9);
    expect(Math.sqrt((6 ** 2 * 60) / integral)).toBeCloseTo(Math.sqrt(1.5), 9);
  });

  it('integrate the square of 1 − exp(−μc) to 1e-6 at five and 1e-4 at twelve mean free paths', () => {
    const { paths } = pathsOf({ size_mm: 1, length_mm: 1 });
    const steps = 200_000;
    const integrals = (depth: number) => {
      let exact = 0;
      for (let k = 0; k < steps; k++) {
        const x = (k + 0.5) / steps;
        exact += (1 - Math.exp(-depth * Math.sqrt(1 - x * x))) ** 2 / steps;
      }
      const own = paths.reduce(
        (sum, path) => sum + path.area_mm2 * (1 - Math.exp(-depth * path.detail_mm)) ** 2,
        0,
      );
      return own / exact - 1;
    };
    expect(Math.abs(integrals(5))).toBeLessThan(1e-6);
    expect(Math.abs(integrals(12))).toBeLessThan(1e-4);
  });

  it('fill only part of the lumen with agent and displace all of it', () => {
    const { central } = pathsOf({ size_mm: 6, fillingFraction: 0.4 });
    expect(central).toEqual({ displaced_mm: 6, detail_mm: 2.4000000000000004 });
  });
});

describe('the paths through other shapes', () => {
  it('have one thickness over length times width', () => {
    expect(pathsOf({ shape: 'slab', size_mm: 3, length_mm: 8, width_mm: 5 }).paths).toEqual([
      { displaced_mm: 3, detail_mm: 3, area_mm2: 40 },
    ]);
  });

  it('take the length for a width that is not given', () => {
    expect(pathsOf({ shape: 'insert', size_mm: 3, length_mm: 8 }).paths[0].area_mm2).toBe(64);
  });

  it('count a coat once for each wall', () => {
    expect(pathsOf({ shape: 'coat', size_mm: 0.4, walls: 2 }).central.detail_mm).toBe(0.8);
  });
});

describe('a detail in its layer', () => {
  it('is magnified by source–detector over source–centre distance', () => {
    const detail = detailIn(abdomen());
    expect(detail.centreDepth_mm).toBe(105);
    expect(detail.magnification).toBeCloseTo(1150 / (848 + 105), 12);
  });

  it('is not magnified in a parallel beam', () => {
    const room = { geometry: { beam: 'parallel', sourceToDetector_mm: 1150 } };
    expect(detailIn(abdomen({ room })).magnification).toBe(1);
  });

  it('lies in the middle of its layer unless told otherwise', () => {
    const detail = { ...vessel, depthInLayer_mm: null };
    expect(detailIn(abdomen({ detail })).centreDepth_mm).toBe(20 + 85);
  });

  it('keeps its share of the layer’s depth as the layer grows', () => {
    const c = abdomen({ detail: { ...vessel, depthInLayer_mm: 34 } });
    // The abdomen grows from 170 to 205 mm and lies behind 35 mm instead of 20.
    expect(detailIn(c, stackIn(c, 252)).centreDepth_mm).toBeCloseTo(35 + 205 * 0.2, 9);
  });

  it('is moved inward where it would stick out of the layer', () => {
    const c = abdomen({ detail: { ...vessel, depthInLayer_mm: 1 } });
    expect(detailIn(c).centreDepth_mm).toBe(20 + 3);
  });

  it('is refused when the layer is thinner than the detail at this size', () => {
    const c = abdomen({ detail: { ...vessel, inLayer: 'spine', size_mm: 13 } });
    expect(refusals(placeDetail(c, stackIn(c)))).toMatchObject([
      { code: 'detailThickerThanLayer', severity: 'limit', value: 13, bound: 12 },
    ]);
  });

  it('carries a caution when its depth lies beyond the layer', () => {
    const c = abdomen({ detail: { ...vessel, depthInLayer_mm: 400 } });
    expect(detailIn(c).findings).toMatchObject([{ code: 'detailDepth', severity: 'caution' }]);
  });

  it('is refused when its layer does not exist', () => {
    const c = abdomen({ detail: { ...vessel, inLayer: 'pelvis' } });
    expect(refusals(placeDetail(c, stackIn(c)))[0].code).toBe('detailLayer');
  });
});

describe('what a detail is made of', () => {
  it('is stated as areal density, mass and concentration of the attenuating element', () => {
    const { agent } = detailIn(abdomen());
    expect(agent).toMatchObject({ element: 'I', z: 53, isInvestigational: false });
    expect(agent?.elementConcentration_mg_per_mL).toBeCloseTo(120, 9);
    expect(agent?.arealDensity_mg_per_cm2).toBeCloseTo(120 * 0.6, 9);
    expect(agent?.elementMass_g).toBeCloseTo((0.12 * Math.PI * 9 * 10) / 1000, 9);
  });

  it('scales areal density and mass with the filled share', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.05, max: 1, noNaN: true }), (fillingFraction) => {
        const { agent } = detailIn(abdomen({ detail: { ...vessel, fillingFraction } }));
        expect(agent?.arealDensity_mg_per_cm2).toBeCloseTo(72 * fillingFraction, 9);
      }),
    );
  });

  it('is blood or the layer for reference, as the case says', () => {
    expect(detailIn(abdomen()).reference.name).toBe('blood');
    const own = detailIn(abdomen({ detail: { ...vessel, reference: 'layer' } }));
    expect(own.reference).toBe(own.layer);
  });

  it('of a defect is the layer without its agent, and it has no agent of its own', () => {
    const layers = [
      { name: 'stomach', material: 'water', thickness_mm: 40, agent: iodine(20, null) },
    ];
    const detail = { shape: 'defect', inLayer: 'stomach', size_mm: 5 };
    const placed = detailIn(abdomen({ layers, detail }));
    expect(placed.matter.name).toBe('water');
    expect(placed.layer.density_g_per_cm3).toBeGreaterThan(placed.matter.density_g_per_cm3);
    expect(placed.agent).toBeNull();
  });

  it('of a defect in a layer without agent is refused', () => {
    const c = abdomen({ detail: { shape: 'defect', inLayer: 'abdomen', size_mm: 5 } });
    expect(refusals(placeDetail(c, stackIn(c)))[0].message).toContain('holds none');
  });

  it('of an insert is the material named', () => {
    const detail = { shape: 'insert', inLayer: 'abdomen', size_mm: 5, material: 'aluminium' };
    expect(detailIn(abdomen({ detail })).matter.name).toBe('aluminium');
  });

  it('must be said: neither agent nor material is refused', () => {
    const c = abdomen({ detail: { shape: 'slab', inLayer: 'abdomen', size_mm: 5 } });
    expect(refusals(placeDetail(c, stackIn(c)))[0].code).toBe('detailMatter');
  });
});
