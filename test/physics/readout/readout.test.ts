/** What a beam shows: against closed forms at one energy, then laws of contrast, grid and scale. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { massAttenuation } from '../../../materials/index.js';
import { airKerma_uGy } from '../../../physics/beam/index.js';
import {
  gridPerformance,
  iodineEquivalent_mg_per_cm2,
  noiseAt,
  sdnrAt,
} from '../../../physics/readout/index.js';
import { material } from '../scatter/stacks.js';
import { iodine, vessel } from '../stack/abdomen.js';
import { evenScatter, photons, readAbdomen, tubeBeam } from './read-abdomen.js';

const geometry = { sourceToDetector_mm: 1150 };
const grid = { ratio: 10, strips_per_cm: 40 };
const ideal = { geometry, detector: { material: 'ideal', glare_fraction: 0 } };

const linear = (name: string, energy: number): number =>
  massAttenuation(material(name), energy) * material(name).density_g_per_cm3;

describe('an ideal detector at one energy', () => {
  const plate = {
    shape: 'insert',
    inLayer: 'abdomen',
    material: 'aluminium',
    size_mm: 2,
    length_mm: 8,
    width_mm: 5,
  };

  it('sees the contrast 1 − exp(−Δμ t) and the SdNR C√(N·A) of N photons per mm²', () => {
    const { readout, detail } = readAbdomen(
      { detail: plate, room: ideal },
      { atDetector: photons(60, 4e4) },
    );
    const contrast = -Math.expm1(-(linear('aluminium', 60) - linear('soft tissue', 60)) * 0.2);
    const area_mm2 = 40 * detail.magnification ** 2;
    expect(readout.contrast.subject / contrast).toBeCloseTo(1, 12);
    expect(readout.contrast.logarithmic).toBeCloseTo(-Math.log1p(-contrast), 12);
    expect(readout.effectiveArea_mm2).toBeCloseTo(area_mm2, 9);
    expect(sdnrAt(readout, 1) / (contrast * Math.sqrt(4e4 * area_mm2))).toBeCloseTo(1, 12);
    expect(readout.absorbedFraction).toBeCloseTo(1, 12);
  });

  it('with scatter loses contrast by 1/(1 + SPR) and SdNR by 1/√(1 + SPR)', () => {
    const at = (spr: number) =>
      readAbdomen(
        { detail: plate, room: ideal },
        { atDetector: photons(60, 4e4), scatterOn: evenScatter(spr) },
      ).readout;
    expect(at(3).contrast.degradationFactor).toBeCloseTo(0.25, 12);
    expect(at(3).contrast.detected).toBeCloseTo(at(0).contrast.detected / 4, 12);
    expect(sdnrAt(at(3), 1)).toBeCloseTo(sdnrAt(at(0), 1) / 2, 9);
    expect(at(3).detectorAirKerma_uGy_per_mAs).toBeCloseTo(
      4 * at(0).detectorAirKermaPrimary_uGy_per_mAs,
      12,
    );
  });

  it('reads the air kerma of the beam in front of it', () => {
    const atDetector = photons(60, 4e4);
    const { readout } = readAbdomen({ room: ideal, detail: plate }, { atDetector });
    expect(readout.detectorAirKerma_uGy_per_mAs).toBeCloseTo(airKerma_uGy(atDetector), 12);
  });

  it('has noise of 1/√(N·A) and nothing else', () => {
    const { readout } = readAbdomen(
      { room: ideal, detail: plate },
      { atDetector: photons(60, 4e4) },
    );
    const { quantum, electronic, structure, background, total } = noiseAt(readout, 1);
    expect(quantum * Math.sqrt(4e4 * readout.effectiveArea_mm2)).toBeCloseTo(1, 12);
    expect([electronic, structure, background]).toEqual([0, 0, 0]);
    expect(total).toBe(quantum);
  });
});

describe('contrast', () => {
  it('of carbon dioxide is negative, its SdNR is not, and no iodine is equivalent', () => {
    const co2 = { name: 'carbon dioxide', amount: { value: 1, unit: '% w/v' } };
    const { readout, weights, atDetector } = readAbdomen({ detail: { ...vessel, agent: co2 } });
    expect(readout.contrast.subject).toBeLessThan(0);
    expect(readout.contrast.logarithmic).toBeLessThan(0);
    expect(readout.contrast.detected).toBeLessThan(0);
    expect(sdnrAt(readout, 1)).toBeGreaterThan(0);
    expect(
      iodineEquivalent_mg_per_cm2(
        weights,
        atDetector.energies_keV,
        atDetector.fluence_per_mm2,
        readout.contrast.subject,
      ),
    ).toBeNull();
  });

  it('of a defect in a filled layer is negative: it lets more through', () => {
    const layers = [
      { name: 'colon', material: 'water', thickness_mm: 40, agent: iodine(20, null) },
      { name: 'back', material: 'soft tissue', thickness_mm: 120 },
    ];
    const detail = { shape: 'defect', inLayer: 'colon', size_mm: 8 };
    expect(readAbdomen({ layers, detail }).readout.contrast.subject).toBeLessThan(0);
  });

  it('of a detail that is its own reference is zero, and its noise is finite', () => {
    const detail = { ...vessel, agent: null, material: 'blood' };
    const { readout } = readAbdomen({ detail });
    expect(readout.contrast.subject).toBe(0);
    expect(sdnrAt(readout, 1)).toBe(0);
    expect(noiseAt(readout, 1).quantum).toBeGreaterThan(0);
    expect(Number.isFinite(noiseAt(readout, 1).total)).toBe(true);
  });

  it('of an opaque detail is 1 with a finite logarithm', () => {
    const detail = { shape: 'insert', inLayer: 'abdomen', size_mm: 100, material: 'lead' };
    const { contrast } = readAbdomen({ detail }).readout;
    expect(contrast.subject).toBeCloseTo(1, 12);
    expect(contrast.logarithmic).toBeGreaterThan(20);
    expect(Number.isFinite(contrast.logarithmic)).toBe(true);
  });

  it('does not depend on the order of the layers in a parallel beam', () => {
    const room = { geometry: { ...geometry, beam: 'parallel' } };
    const layers = [
      { name: 'front', material: 'adipose', thickness_mm: 20 },
      { name: 'abdomen', material: 'soft tissue', thickness_mm: 170 },
      { name: 'spine', material: 'cortical bone', thickness_mm: 12 },
    ];
    const forward = readAbdomen({ room, layers }).readout;
    const backward = readAbdomen({ room, layers: [...layers].reverse() }).readout;
    expect(backward.contrast.subject / forward.contrast.subject).toBeCloseTo(1, 12);
    expect(sdnrAt(backward, 1) / sdnrAt(forward, 1)).toBeCloseTo(1, 12);
  });

  it('of iodine falls from 70 to 110 kV behind an abdomen', () => {
    const at = (kV: number) => readAbdomen({}, { beam: tubeBeam(kV) }).readout.contrast.subject;
    expect(at(70)).toBeGreaterThan(at(90));
    expect(at(90)).toBeGreaterThan(at(110));
  });
});

describe('SdNR of a vessel', () => {
  it('is overstated by √1.5 where the central chord is taken over the whole width (thin signal)', () => {
    const detail = { ...vessel, size_mm: 3, agent: iodine(2) };
    const { readout, detail: placed } = readAbdomen({ detail, room: ideal });
    const { c, a } = readout.coefficients;
    const wholeArea_mm2 = 3 * 10 * placed.magnification ** 2;
    const naive = (readout.signalDifference_per_mm2_per_mAs ** 2 * wholeArea_mm2) / a;
    expect(Math.sqrt(naive / (c / a))).toBeCloseTo(Math.sqrt(1.5), 2);
    expect(readout.effectiveArea_mm2 / wholeArea_mm2).toBeCloseTo(2 / 3, 2);
  });

  it('falls with the filled share no faster than in proportion', () => {
    const at = (fillingFraction: number) =>
      sdnrAt(readAbdomen({ detail: { ...vessel, fillingFraction } }).readout, 10);
    expect(at(0.5)).toBeGreaterThan(at(1) / 2);
    expect(at(0.5)).toBeLessThan(at(1));
  });
});

describe('the grid in the readout', () => {
  const scatterOn = evenScatter(4, 0.8);

  it('obeys Tt = (Tp + Ts·SPR)/(1 + SPR) with the ratios read', () => {
    const { readout } = readAbdomen({ room: { geometry, grid } }, { gridIn: true, scatterOn });
    const { primaryTransmission: tp, scatterTransmission: ts } = readout.grid ?? {
      primaryTransmission: Number.NaN,
      scatterTransmission: Number.NaN,
    };
    expect(readout.spr).toBeCloseTo(4, 12);
    expect(readout.sprBehindGrid).toBeCloseTo(0.8, 12);
    expect((ts * 4) / tp).toBeCloseTo(0.8, 12);
    expect(readout.grid).toEqual(gridPerformance(tp, ts, readout.spr));
    expect(tp).toBeGreaterThan(0.6);
    expect(tp).toBeLessThan(0.8);
  });

  it('gives way to what the user measured', () => {
    const measured = { primaryTransmission: 0.68, scatterTransmission: 0.12 };
    const { readout } = readAbdomen(
      { room: { geometry, grid: { ...grid, measured } } },
      { gridIn: true, scatterOn },
    );
    expect(readout.grid).toMatchObject(measured);
    expect(readout.sprBehindGrid).toBeCloseTo((4 * 0.12) / 0.68, 12);
    const open = readAbdomen({ room: { geometry, grid } }, { scatterOn }).readout;
    expect(readout.signalPrimary_per_mm2_per_mAs / open.signalPrimary_per_mm2_per_mAs).toBeCloseTo(
      0.68,
      12,
    );
  });

  it('leaves no trace when it is out', () => {
    const { readout } = readAbdomen({ room: { geometry, grid } }, { scatterOn });
    expect(readout.grid).toBeNull();
    expect(readout.sprBehindGrid).toBe(readout.spr);
  });
});

describe('scaling the beam', () => {
  it('scales signals and changes no ratio', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-3, max: 1e3, noNaN: true }), (factor) => {
        const one = readAbdomen({}, { scatterOn: evenScatter(2) });
        const scaled = one.atDetector.fluence_per_mm2.map((fluence) => fluence * factor);
        const beam = { ...one.atDetector, fluence_per_mm2: scaled };
        const two = readAbdomen({}, { atDetector: beam, scatterOn: evenScatter(2) }).readout;
        const { readout } = one;
        expect(two.contrast.subject / readout.contrast.subject).toBeCloseTo(1, 12);
        expect(two.spr / readout.spr).toBeCloseTo(1, 12);
        expect(sdnrAt(two, 1 / factor) / sdnrAt(readout, 1)).toBeCloseTo(1, 10);
      }),
      { numRuns: 20 },
    );
  });
});
