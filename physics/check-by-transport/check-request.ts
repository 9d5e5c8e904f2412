/** One run to be flown: whose beam, at which size, how many photons, from which seed. */
export interface CheckRequest {
  /** Name of a technique of the case. */
  readonly technique: string;
  /** Name of a size of the mix. */
  readonly size: string;
  /** Whole number from 1 upward. */
  readonly photons: number;
  readonly seed: number;
}
