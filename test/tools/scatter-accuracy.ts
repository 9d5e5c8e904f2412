/**
 * Holds the scatter estimate against photon transport and writes test/reference/scatter-accuracy.csv:
 * `npx tsx test/tools/scatter-accuracy.ts [photons per run]`, some minutes.
 */
import { writeFileSync } from 'node:fs';
import { absorptionEdges } from '../../materials/index.js';
import { runTransport } from '../../physics/jobs/index.js';
import { scatterResponses } from '../../physics/scatter/index.js';
import {
  buildTransportInput,
  type Estimated,
  scatterToPrimary,
} from '../../physics/transport/index.js';
import {
  accuracyBeam,
  accuracyDetector,
  accuracyGeometries,
  accuracyGrid,
  accuracyPotentials_kV,
  accuracyStacks,
} from '../physics/scatter/accuracy-stacks.js';
import { spectrumSpr } from '../physics/scatter/spectrum-spr.js';

const photons = Number(process.argv[2] ?? 400_000);
const seed = 71;

const lines = [
  '# Scatter-to-primary ratio of detector signal: estimate against photon transport (computed here).',
  '# Point source at 110 cm, laterally infinite layers, CsI 200 mg/cm2, 10:1 lead grid, tungsten 12 deg + 3 mm Al.',
  `# ${photons} photons per run, seed ${seed}; standard errors of transport (1 sigma). Written by test/tools/scatter-accuracy.ts.`,
  'stack,role,gap_cm,field_cm,potential_kV,transport,transport_error,estimate,transport_grid,transport_grid_error,estimate_grid',
];
const number = (value: number) => value.toPrecision(5);
const both = ({ value, standardError }: Estimated) =>
  `${number(value)},${number(standardError ?? 0)}`;

accuracyStacks.forEach(({ name, role, layers }, index) => {
  const edges = layers.flatMap(([material]) =>
    absorptionEdges(material, 10, 150).map((e) => e.energy_keV),
  );
  for (const { gap_cm, field_cm, stack } of accuracyGeometries(index)) {
    const responses = scatterResponses(stack, accuracyDetector, accuracyGrid);
    for (const potential_kV of accuracyPotentials_kV) {
      const beam = accuracyBeam(potential_kV, edges);
      const grid = (energy: number, cosine: number) => accuracyGrid.lookup(energy, cosine);
      const input = buildTransportInput(stack, beam, accuracyDetector, grid, { photons, seed });
      const scores = runTransport(input);
      const estimate = spectrumSpr(stack, responses, beam, accuracyDetector, accuracyGrid);
      const open = scatterToPrimary(input, scores);
      const behind = scatterToPrimary(input, scores, { behindGrid: true });
      lines.push(
        `${name},${role},${gap_cm},${field_cm},${potential_kV},${both(open)},${number(estimate.open)},${both(behind)},${number(estimate.behindGrid)}`,
      );
      process.stderr.write(`${lines.at(-1)}\n`);
    }
  }
});
writeFileSync(
  new URL('../reference/scatter-accuracy.csv', import.meta.url),
  `${lines.join('\n')}\n`,
);
