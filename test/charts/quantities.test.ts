/** What the words say of a number is how the number comes about. */
import { describe, expect, it } from 'vitest';
import { quantities, quantity } from '../../components/charts/quantities.js';
import { prepare } from '../../physics/prepare.js';
import { sizesOf } from '../../physics/stack/sizes.js';
import { weigh } from '../../physics/weigh.js';
import { parsedExample } from '../examples/read-example.js';

const parsed = parsedExample('aortography');
const { case: c } = parsed;
const [first] = weigh(parsed, sizesOf(c.patient).slice(2, 3)).evaluations;
const valueIn = (id: string): number => {
  const value = quantity(id).of(first);
  if (value === null) throw new Error(`${id}: no value`);
  return value;
};

describe('the words of a quantity', () => {
  it('stand on their own: no entry leans on the one above', () => {
    for (const { id, words } of quantities) {
      expect(words, id).toMatch(/^\p{Lu}.*\.$/u);
      expect(words, id).not.toMatch(/^(The same|Ditto|As above)/);
    }
  });

  it('say truly that kerma–area product is reference air kerma times the field there', () => {
    const { field_mm, referencePoint_mm, sourceToDetector_mm } = c.room.geometry;
    const scale = referencePoint_mm / sourceToDetector_mm;
    const area_cm2 = (field_mm[0] * field_mm[1] * scale ** 2) / 100;
    const product_Gycm2 = (valueIn('referenceAirKerma') / 1000) * area_cm2;
    expect(valueIn('kermaAreaProduct') / product_Gycm2).toBeCloseTo(1, 12);
    expect(quantity('kermaAreaProduct').words).toMatch(/^Reference air kerma times the area/);
  });

  it('say truly what skin absorbed dose is a multiple of, and of which skin', () => {
    const ratio = valueIn('skinAbsorbedDose') / valueIn('entranceSurfaceAirKerma');
    // (μen/ρ) of skin over air lies between 0.95 and 1.1 from 20 to 150 keV (NISTIR 5632 tissues).
    expect(ratio).toBeGreaterThan(0.9);
    expect(ratio).toBeLessThan(1.1);
    expect(prepare(c).material('skin').name).toBe('skin');
    expect(quantity('skinAbsorbedDose').words).toMatch(
      /μen\/ρ, skin \(ICRU 46 composition\) over air/,
    );
  });

  it('say truly how contrast is diluted and noise divides it', () => {
    const degradation = 1 / (1 + valueIn('sprBehindGrid'));
    expect(valueIn('contrastDegradation') / degradation).toBeCloseTo(1, 12);
    const kept = 1 - c.room.detector.glare_fraction;
    const detected = valueIn('subjectContrast') * degradation * kept;
    expect(valueIn('detectedContrast') / detected).toBeCloseTo(1, 12);
    expect(valueIn('sdnr') / (Math.abs(detected) / valueIn('noise'))).toBeCloseTo(1, 12);
  });

  it('say truly what a rate and a run are', () => {
    const { frames, maskFrames, frameRate_per_s } = c.techniques[0].acquisition;
    const perFrame = valueIn('incidentAirKerma');
    expect(valueIn('incidentAirKermaRate') / (perFrame * frameRate_per_s * 60)).toBeCloseTo(1, 12);
    expect(valueIn('runIncidentAirKerma') / (perFrame * (frames + maskFrames))).toBeCloseTo(1, 12);
  });

  it('say which beam is meant where air would change the value', () => {
    expect(quantity('halfValueLayer').words).toContain('in vacuum');
    expect(quantity('meanEnergy').words).toContain('in vacuum');
  });
});
