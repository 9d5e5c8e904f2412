import { describe, expect, it } from 'vitest';
import { kept } from '../../../materials/kept.js';
import {
  attenuate,
  halfValueLayer_mm,
  type Spectrum,
  tungstenSpectrum,
} from '../../../physics/beam/index.js';
import { backscatterFactor } from '../../../physics/dose/backscatter.js';
import {
  responsesOn,
  type ScatterResponses,
  scatterResponses,
} from '../../../physics/scatter/index.js';
import { readReference } from '../../reference/read-reference.js';
import { idealDetector, material, stackOf } from './stacks.js';

const aluminium = material('aluminium');

/** The beam of a potential filtered with aluminium to a half-value layer. */
function beamOf(potential_kV: number, halfValueLayer_mmAl: number): Spectrum {
  const tube = tungstenSpectrum({
    potential_kV,
    anodeAngle_deg: 12,
    ripple_percent: 0,
    outputFactor: 1,
  });
  const filtered = (thickness_mm: number) =>
    attenuate(tube, [{ material: aluminium, thickness_mm }]);
  let [low, high] = [0.5, 8];
  for (let step = 0; step < 40; step++) {
    const middle = (low + high) / 2;
    if ((halfValueLayer_mm(filtered(middle), aluminium) ?? 0) < halfValueLayer_mmAl) low = middle;
    else high = middle;
  }
  return filtered(low);
}

const known = new Map<string, ScatterResponses>();

/** A slab of 15 cm with a square field at its face, 100 cm from the source; both beams share one. */
const phantomResponses = (phantom: string, field_cm: number): ScatterResponses =>
  kept(known, `${phantom} ${field_cm}`, () => {
    const side_mm = field_cm * 11.5;
    const stack = stackOf([[material(phantom), 15]], {
      beam: 'point',
      sourceToDetector_mm: 1150,
      field_mm: [side_mm, side_mm],
    });
    return scatterResponses(stack, idealDetector(), null);
  });

const phantoms: Readonly<Record<string, string>> = {
  water: 'water',
  'ICRU tissue': 'soft tissue ICRU four-component',
  PMMA: 'pmma',
};

describe('backscatter factors of 15 cm phantoms at 100 cm', () => {
  // Petoussi-Henss et al., Phys. Med. Biol. 43 (1998) 2237; values recalled, to be met within 3 %.
  const rows = readReference('backscatter.csv').map(({ item, value, conditions }) => {
    const [, phantom, field_cm] = /^B (.+) (\d+)x\d+ cm$/.exec(item) ?? [];
    const [, potential_kV, hvl] = /^(\d+) kV, .*HVL ([\d.]+) mm Al/.exec(conditions) ?? [];
    return {
      phantom: phantoms[phantom],
      field_cm: Number(field_cm),
      potential_kV: Number(potential_kV),
      hvl: Number(hvl),
      expected: Number(value),
    };
  });

  it('are eighteen', () => expect(rows).toHaveLength(18));

  it.each(rows)('$phantom, $field_cm cm, $potential_kV kV: $expected', (row) => {
    const beam = beamOf(row.potential_kV, row.hvl);
    const responses = phantomResponses(row.phantom, row.field_cm);
    const backscatter = responsesOn(responses, beam.energies_keV).backscatter;
    const found = backscatterFactor(beam, backscatter ?? new Float64Array(0));
    expect(Math.abs(found / row.expected - 1), `${found}`).toBeLessThan(0.03);
  });
});
