/**
 * Holds the scatter estimate against photon transport and writes test/reference/scatter-accuracy.csv:
 * `npx tsx test/tools/scatter-accuracy.ts`, some minutes. With a role behind it, as `untouched`, only the
 * rows of that role are made again.
 */
import { readFileSync, writeFileSync } from 'node:fs';
import { absorptionEdges } from '../../materials/index.js';
import { runTransport } from '../../physics/jobs/index.js';
import { scatterResponses } from '../../physics/scatter/index.js';
import {
  buildTransportInput,
  type Estimated,
  scatterToPrimary,
} from '../../physics/transport/index.js';
import {
  type AccuracyStack,
  accuracyBeam,
  accuracyDetector,
  accuracyGeometries,
  accuracyGrid,
  accuracyPotentials_kV,
  accuracyStacks,
} from '../physics/scatter/accuracy-stacks.js';
import { spectrumSpr } from '../physics/scatter/spectrum-spr.js';

const usualSeed = 71;
/** The untouched stacks have a seed that no choice was made with. */
const untouchedSeed = 90_217;
const seedOf = (role: AccuracyStack['role']) => (role === 'untouched' ? untouchedSeed : usualSeed);
/** Standard errors aimed at, and the photons a run may take for them. */
const wanted = { open: 0.008, behindGrid: 0.02 };
const photons = { pilot: 100_000, least: 200_000, most: 8_000_000 };

const relativeError = ({ value, standardError }: Estimated) => (standardError ?? value) / value;

/** Photons for the wanted errors, judged by a pilot run. */
function photonsFor(open: Estimated, behindGrid: Estimated): number {
  const excess = Math.max(
    relativeError(open) / wanted.open,
    relativeError(behindGrid) / wanted.behindGrid,
  );
  return Math.round(
    Math.min(photons.most, Math.max(photons.least, photons.pilot * excess * excess)),
  );
}

const header = [
  'stack,role,gap_cm,field_cm,potential_kV',
  'signal,signal_error,signal_estimate,signal_grid,signal_grid_error,signal_grid_estimate',
  'kerma,kerma_error,kerma_estimate,kerma_grid,kerma_grid_error,kerma_grid_estimate',
];
const lines = [
  '# Scatter-to-primary ratio of detector signal and of air kerma at the detector, without grid and behind it:',
  '# photon transport with its standard error (1 sigma), then the estimate; both computed here.',
  '# Point source at 110 cm, laterally infinite layers, CsI 200 mg/cm2, 10:1 lead grid, tungsten 12 deg + 3 mm Al.',
  `# Seed ${usualSeed}, of untouched stacks ${untouchedSeed}. Written by test/tools/scatter-accuracy.ts.`,
  header.join(),
];
const number = (value: number) => value.toPrecision(5);

/** Transport with its error, then the estimate. */
const compared = ({ value, standardError }: Estimated, estimate: number): string =>
  [value, standardError ?? 0, estimate].map(number).join();

const grid = (energy: number, cosine: number) => accuracyGrid.lookup(energy, cosine);

const table = new URL('../reference/scatter-accuracy.csv', import.meta.url);
const [onlyRole] = process.argv.slice(2);
const kept = readFileSync(table, 'utf8').split('\n');

accuracyStacks.forEach(({ name, role, layers }, index) => {
  if (onlyRole !== undefined && role !== onlyRole) {
    lines.push(...kept.filter((line) => line.startsWith(`${name},${role},`)));
    return;
  }
  const seed = seedOf(role);
  const edges = layers.flatMap(([material]) =>
    absorptionEdges(material, 10, 150).map(({ energy_keV }) => energy_keV),
  );
  for (const { gap_cm, field_cm, stack } of accuracyGeometries(index)) {
    const responses = scatterResponses(stack, accuracyDetector, accuracyGrid);
    for (const potential_kV of accuracyPotentials_kV) {
      const beam = accuracyBeam(potential_kV, edges);
      const run = (count: number, runSeed: number) => {
        const request = { photons: count, seed: runSeed };
        const input = buildTransportInput(stack, beam, accuracyDetector, grid, request);
        const scores = runTransport(input);
        return (quantity: 'signal' | 'airKerma', behindGrid: boolean) =>
          scatterToPrimary(input, scores, { quantity, behindGrid });
      };
      const pilot = run(photons.pilot, seed + 1);
      const found = run(photonsFor(pilot('signal', false), pilot('signal', true)), seed);
      const columns = (['signal', 'airKerma'] as const).flatMap((quantity) => {
        const estimate = spectrumSpr(
          stack,
          responses,
          beam,
          accuracyDetector,
          accuracyGrid,
          quantity,
        );
        return [
          compared(found(quantity, false), estimate.open),
          compared(found(quantity, true), estimate.behindGrid),
        ];
      });
      lines.push([name, role, gap_cm, field_cm, potential_kV, ...columns].join());
      process.stderr.write(`${lines.at(-1)}\n`);
    }
  }
});
writeFileSync(table, `${lines.join('\n')}\n`);
