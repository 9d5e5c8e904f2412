import type { ParsedCase } from '../../../physics/case/index.js';
import type { Case } from '../../../physics/case/schema.js';
import {
  type PercentileResult,
  shownPercentiles,
  type ThicknessResult,
  thicknessNodes,
} from '../../../physics/sizes.js';
import { sizesOf } from '../../../physics/stack/sizes.js';
import type { SweepPool } from '../../workers/sweep-pool.js';

/** What is computed beside the sizes of the mix. */
export interface SizesAnswer {
  readonly percentiles: readonly PercentileResult[];
  /** At thicknesses that a control curve makes worth drawing. */
  readonly between: readonly ThicknessResult[];
}

/** Everything of a case its size mix depends on, as one text; prose leaves it as it is. */
export const sizesBasis = ({
  materials,
  room,
  patient,
  task,
  techniques,
  agentsCompared,
}: Case): string => JSON.stringify([materials, room, patient, task, techniques, agentsCompared]);

/** Asks the workers for the percentiles of the mix, and for what lies between its sizes. */
export async function askSizes(
  pool: SweepPool,
  parsed: ParsedCase,
  signal: AbortSignal,
): Promise<SizesAnswer> {
  const { case: c } = parsed;
  const own = sizesOf(c.patient);
  const isMix = own.length > 1;
  const percentileTasks = (isMix ? shownPercentiles : []).map(
    (percentile) => ({ kind: 'percentile', percentile }) as const,
  );
  const betweenTasks = thicknessNodes(c)
    .filter((size) => !own.includes(size))
    .map((size) => ({ kind: 'thickness', size }) as const);
  const [percentiles, between] = await Promise.all([
    pool.run(parsed, percentileTasks, { signal, urgent: true }),
    pool.run(parsed, betweenTasks, { signal, urgent: true }),
  ]);
  return { percentiles, between };
}
