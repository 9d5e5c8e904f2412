import { operatingPoint } from '../../physics/operating-point.js';
import { outputBeam } from '../../physics/output-beam.js';
import { prepare } from '../../physics/prepare.js';
import { readoutWeights } from '../../physics/readout/index.js';
import { sizesOf } from '../../physics/stack/sizes.js';
import { frontierOf } from '../../physics/sweep/frontier.js';
import { combineSweep, sweepPiece, sweepPieceCount, wholeRoom } from '../../physics/sweep.js';
import { sampleCase } from '../physics/sample-case.js';
import type { Contest } from './bench.js';

const copper = [0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9];
const c = sampleCase({
  room: {
    tube: { potential_kV: { min: 50, max: 125, step: 1 } },
    filters: [
      { name: 'none', layers: [] },
      ...copper.map((thickness_mm) => ({
        name: `${thickness_mm} Cu`,
        layers: [{ material: 'copper', thickness_mm }],
      })),
    ],
  },
  patient: {
    sizes: [15, 18, 20, 22, 24, 26, 28, 30, 34].map((cm) => ({
      name: `${cm} cm`,
      thickness_mm: 10 * cm,
    })),
  },
}).case;
const request = wholeRoom(c, 'sdnr');
const pieces = () =>
  Array.from({ length: sweepPieceCount(request) }, (_, index) => sweepPiece(c, request, index));

const began_ms = performance.now();
const first = pieces();
const swept = combineSweep(request, first);
const cold_ms = performance.now() - began_ms;

/** The beam of every setting and the rows it is read with: what a setting cannot do without. */
const beams = sizesOf(c.patient).flatMap((size) => {
  const point = operatingPoint(c, c.techniques[0], size);
  if (!('made' in point)) return [];
  const { chain } = point.made;
  return request.axes.potentials_kV.flatMap((potential_kV) =>
    request.axes.filters.flatMap((filter) => {
      const { spectrum } = outputBeam(prepare(c), potential_kV, filter);
      return spectrum
        ? [{ spectrum, rows: readoutWeights(chain, spectrum.energies_keV).rows }]
        : [];
    }),
  );
});
/** Beside the readout: three air kermas, backscatter, one layer's energy. */
const doseRows = 5;

const dotProducts = (): number => {
  let total = 0;
  for (const { spectrum, rows } of beams) {
    const { fluence_per_mm2: fluence } = spectrum;
    const channels = fluence.length;
    const count = rows.length / channels + doseRows;
    for (let row = 0; row < count; row++) {
      const start = (row * channels) % (rows.length - channels + 1);
      let sum = 0;
      for (let i = 0; i < channels; i++) sum += rows[start + i] * fluence[i];
      total += sum;
    }
  }
  return total;
};

const count = swept.settings.length;

/** Settings per second = their number over the time per call. */
export const contests: readonly Contest[] = [
  {
    title: `${count} settings, all quantities and limits, ${swept.frontier.members.length} on the frontier (first time ${Math.round(cold_ms)} ms)`,
    contenders: [
      { name: 'the bare dot products of its readings and doses', run: dotProducts },
      { name: 'every piece of the sweep, scatter known', run: pieces },
      { name: 'finding the frontier', run: () => frontierOf(swept.settings, request.costs) },
      { name: 'frontier, nearest allowed, one object', run: () => combineSweep(request, first) },
    ],
  },
];
