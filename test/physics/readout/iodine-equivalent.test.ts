import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { massAttenuationOn } from '../../../materials/index.js';
import { iodineEquivalent_mg_per_cm2 } from '../../../physics/readout/index.js';
import { material } from '../scatter/stacks.js';
import { iodine, vessel } from '../stack/abdomen.js';
import { type AbdomenRead, readAbdomen, tubeBeam } from './read-abdomen.js';

const equivalent = ({ weights, atDetector, readout }: AbdomenRead): number | null =>
  iodineEquivalent_mg_per_cm2(
    weights,
    atDetector.energies_keV,
    atDetector.fluence_per_mm2,
    readout.contrast.subject,
  );

describe('iodine-equivalent areal density', () => {
  it('undoes the contrast of bare iodine laid on the background, to 1e-9', () => {
    const read = readAbdomen({ detail: { ...vessel, reference: 'layer' } });
    const { energies_keV, fluence_per_mm2 } = read.atDetector;
    const { epsilon } = read.weights.chain.detector.on(energies_keV);
    const attenuation = massAttenuationOn(material('iodine'), energies_keV);
    fc.assert(
      fc.property(fc.double({ min: 0.01, max: 800, noNaN: true }), (density_mg_per_cm2) => {
        let background = 0;
        let behind = 0;
        energies_keV.forEach((energy, i) => {
          const signal = energy * epsilon[i] * fluence_per_mm2[i];
          background += signal;
          behind += signal * Math.exp((-attenuation[i] * density_mg_per_cm2) / 1000);
        });
        const found = iodineEquivalent_mg_per_cm2(
          read.weights,
          energies_keV,
          fluence_per_mm2,
          1 - behind / background,
        );
        expect((found ?? 0) / density_mg_per_cm2).toBeCloseTo(1, 7);
      }),
    );
  });

  it('of an iodinated vessel is its own areal density within 1 %: the carrier displaced hardly counts', () => {
    for (const mg_per_mL of [5, 50, 200]) {
      const own = equivalent(readAbdomen({ detail: { ...vessel, agent: iodine(mg_per_mL) } })) ?? 0;
      expect(Math.abs(own / (mg_per_mL * 0.6) - 1)).toBeLessThan(0.01);
    }
  });

  /*
   * Nyman et al. 2002 (Radiology 223, 311): 0.5 mol/L gadolinium chelate attenuates like 60–80 mg
   * I/mL at 70–90 kV. How thick their object was we do not know: 15 cm of water is taken, and the
   * equivalent rises with thickness (10 cm: 56–72, 20 cm: 65–84), so single potentials get 5 mg/mL.
   */
  it('of 0.5 mol/L gadolinium is 60–80 mg I/mL at 70–90 kV (Nyman et al. 2002)', () => {
    const agent = {
      name: 'gadolinium chelate',
      amount: { value: 0.5, unit: 'mmol/mL' },
      carrier: 'blood',
    };
    const layers = [{ name: 'abdomen', material: 'water', thickness_mm: 150 }];
    const detail = { ...vessel, size_mm: 2, agent };
    const own = [70, 80, 90].map((kV) => {
      const equivalent_mg_per_cm2 = equivalent(
        readAbdomen({ layers, detail }, { beam: tubeBeam(kV) }),
      );
      return (equivalent_mg_per_cm2 ?? 0) / 0.2;
    });
    for (const mg_per_mL of own) {
      expect(mg_per_mL).toBeGreaterThan(60 - 5);
      expect(mg_per_mL).toBeLessThan(80 + 5);
    }
    const mean = own.reduce((sum, value) => sum + value, 0) / own.length;
    expect(mean).toBeGreaterThan(60);
    expect(mean).toBeLessThan(80);
  });
});
