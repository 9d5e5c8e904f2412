/**
 * Photons per second of a run from its first report on: workers take a while to start, and nothing
 * is known before. Null until there are two reports.
 */
export function photonRate(now_ms: () => number): (photons: number) => number | null {
  let first: { readonly photons: number; readonly at_ms: number } | null = null;
  let latest: number | null = null;
  return (photons) => {
    const at_ms = now_ms();
    if (first === null) first = { photons, at_ms };
    else if (at_ms > first.at_ms && photons > first.photons) {
      latest = (1000 * (photons - first.photons)) / (at_ms - first.at_ms);
    }
    return latest;
  };
}
