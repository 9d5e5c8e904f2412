/**
 * `npm run bench`: times each contest of `*.bench.ts` and prints times and, what counts, ratios
 * within the run. `npm run bench -- NAME` runs only the files whose name holds NAME.
 */
import { readdirSync } from 'node:fs';
import { type Contest, compete } from './bench.js';

const folder = new URL('.', import.meta.url);
const files = readdirSync(folder)
  .filter((name) => name.endsWith('.bench.ts') && name.includes(process.argv[2] ?? ''))
  .sort();
if (files.length === 0) {
  console.error(
    `bench: ${process.argv[2]}: must be part of the name of a file test/bench/*.bench.ts`,
  );
  process.exitCode = 2;
}

const time = (time_ms: number) =>
  time_ms >= 1 ? `${time_ms.toPrecision(3)} ms` : `${(time_ms * 1000).toPrecision(3)} µs`;

console.log(`${'contest, contender'.padEnd(58)}${'per call'.padStart(10)}   ratio (quartiles)`);
for (const file of files) {
  const { contests } = (await import(new URL(file, folder).href)) as { contests: Contest[] };
  for (const contest of contests) {
    console.log(`\n${contest.title}`);
    for (const { name, time_ms, ratio, ratioQuartiles } of compete(contest)) {
      const [low, high] = ratioQuartiles.map((value) => value.toFixed(2));
      const row = `  ${name.padEnd(56)}${time(time_ms).padStart(10)}`;
      console.log(`${row}   ${ratio.toFixed(2)} (${low} to ${high})`);
    }
  }
}
