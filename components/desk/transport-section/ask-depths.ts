import type { ParsedCase } from '../../../physics/case/index.js';
import type { DepthProfiles } from '../../../physics/depth-profiles.js';
import type { Evaluator } from '../../workers/evaluator.js';
import { latestWins, superseded } from '../../workers/latest-wins.js';

/** Where what happens along the depth goes. */
export interface DepthSink {
  readonly depths: (profiles: readonly DepthProfiles[]) => void;
  /** Why there is none; empty when asked again. */
  readonly trouble: (words: string) => void;
}

/**
 * Asks for absorbed energy and scatter along the depth at a size. Answers to a case that has changed
 * since are dropped; failures are told, unless a later question is under way.
 */
export function askDepths(
  evaluator: () => Pick<Evaluator, 'load' | 'depths'>,
  parsed: () => ParsedCase,
  sink: DepthSink,
): (size: string) => Promise<void> {
  const ask = latestWins(async (size: string) => {
    const [, profiles] = await Promise.all([evaluator().load(parsed()), evaluator().depths(size)]);
    return profiles;
  });
  return async (size) => {
    const asked = parsed();
    sink.trouble('');
    try {
      const profiles = await ask(size);
      if (profiles !== superseded && asked === parsed()) sink.depths(profiles);
    } catch (error) {
      if (asked !== parsed()) return;
      const reason = error instanceof Error ? error.message : String(error);
      sink.trouble(`What happens along the depth could not be computed: ${reason}`);
    }
  };
}
