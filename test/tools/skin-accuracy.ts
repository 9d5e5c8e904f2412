/**
 * Holds the estimate of what the skin receives, with and without a support before it, against photon
 * transport and writes test/reference/skin-accuracy.csv: `npx tsx test/tools/skin-accuracy.ts`, a minute.
 */
import { writeFileSync } from 'node:fs';
import { runTransport } from '../../physics/jobs/index.js';
import { scatterResponses } from '../../physics/scatter/index.js';
import {
  backscatterFactor,
  buildTransportInput,
  type Estimated,
  layerEnergy_keV,
  scatterToPrimary,
} from '../../physics/transport/index.js';
import { accuracyDetector, accuracyGrid } from '../physics/scatter/accuracy-stacks.js';
import {
  skinBeam,
  skinEstimate,
  skinPotentials_kV,
  skinScenes,
} from '../physics/scatter/skin-scenes.js';
import { spectrumSpr } from '../physics/scatter/spectrum-spr.js';

const seed = 4101;
const photons = 400_000;

const lines = [
  '# Behind a support: backscatter factor (all scatter at the skin, both ways, over primary), absorbed dose of',
  '# the first layer over incident air kerma, and scatter-to-primary ratio of signal without grid: photon',
  '# transport with its standard error (1 sigma), then the estimate; both computed here.',
  '# Source 110 cm from the detector, gap 10 cm, laterally infinite layers, CsI 200 mg/cm2, tungsten 12 deg + 3 mm Al.',
  `# Seed ${seed}, ${photons} photons a row. Written by test/tools/skin-accuracy.ts.`,
  'scene,potential_kV,backscatter,backscatter_error,backscatter_estimate,dose,dose_error,dose_estimate,spr,spr_error,spr_estimate',
];
const compared = ({ value, standardError }: Estimated, estimate: number): string =>
  [value, standardError ?? 0, estimate].map((number) => number.toPrecision(5)).join();

for (const { name, stack } of skinScenes) {
  const responses = scatterResponses(stack, accuracyDetector, accuracyGrid);
  for (const potential_kV of skinPotentials_kV) {
    const beam = skinBeam(potential_kV);
    const input = buildTransportInput(stack, beam, accuracyDetector, null, { photons, seed });
    const scores = runTransport(input);
    const estimate = skinEstimate(stack, responses, potential_kV);
    const spr = spectrumSpr(stack, responses, beam, accuracyDetector, accuracyGrid);
    const { mass_g_per_cm2, area_cm2 } = input.layers[0];
    const energy = layerEnergy_keV(input, scores, 0);
    const perKerma = 1 / (mass_g_per_cm2 * area_cm2 * input.primary.kermaAtSkin);
    const dose = {
      value: energy.value * perKerma,
      standardError: (energy.standardError ?? 0) * perKerma,
    };
    lines.push(
      [
        `"${name}"`,
        potential_kV,
        compared(backscatterFactor(input, scores), estimate.backscatterFactor),
        compared(dose, estimate.firstLayerDose_mGy_per_mGy),
        compared(scatterToPrimary(input, scores), spr.open),
      ].join(),
    );
    process.stderr.write(`${lines.at(-1)}\n`);
  }
}
writeFileSync(new URL('../reference/skin-accuracy.csv', import.meta.url), `${lines.join('\n')}\n`);
