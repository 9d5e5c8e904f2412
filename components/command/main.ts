#!/usr/bin/env node
import { readFileSync } from 'node:fs';
import { run } from './run.js';

// A reader that stops early (`| head`) is no error.
process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code !== 'EPIPE') throw error;
});

process.exitCode = await run(process.argv.slice(2), {
  out: (text) => process.stdout.write(text),
  err: (text) => process.stderr.write(text),
  readFile: (path) => readFileSync(path, 'utf8'),
  ...(process.stderr.isTTY
    ? { progress: (line) => process.stderr.write(`\r\u001b[K${line}`) }
    : {}),
});
