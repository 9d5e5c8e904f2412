import { firstOrder } from './first-order.js';
import { broadened } from './geometry.js';
import { gridGains } from './grid-share.js';
import type { InfiniteField } from './infinite-field.js';
import { fieldShares } from './multiple-share.js';
import type { ScatterScene } from './scatter-scene.js';
import { airKermaScore, scoreCount } from './scores.js';

/**
 * Scatter over primary of every detector score, over the nodes: exact first order C + R, and multiple
 * scatter of the infinite field M∞ brought to this field, gap and beam.
 *
 * SPR = C + R + M∞ · f without grid, C + R + M∞ · f · G/G∞ behind it; f from `fieldShares`, G as in
 * `gridShare`.
 */
export function estimate(scene: ScatterScene, { multiple }: InfiniteField): Float64Array[] {
  const { slabs, geometry, nodes, table, grid } = scene;
  const here = firstOrder(slabs, geometry, nodes, table);
  const broad = firstOrder(slabs, broadened(geometry), nodes, table);
  const shares = fieldShares(scene, here, broad);
  const gains = grid && gridGains(slabs, geometry, nodes, grid);
  return multiple.map((values, score) => {
    const share = shares[score % scoreCount];
    const isAirKerma = score % scoreCount === airKermaScore;
    const gain = score < scoreCount ? null : gains?.[isAirKerma ? 'fluence' : 'plane'];
    return values.map(
      (value, i) =>
        here.compton[score][i] + here.rayleigh[score][i] + value * share[i] * (gain ? gain[i] : 1),
    );
  });
}
