import { Worker } from 'node:worker_threads';
import type { FromTransportWorker, TransportWorker } from './transport-messages.js';

/** A thread of Node that flies photons, for the command line. Runs from source and when built. */
export function makeTransportThread(): TransportWorker {
  const fromSource = import.meta.url.endsWith('.ts');
  const script = new URL(`./transport-thread.${fromSource ? 'ts' : 'js'}`, import.meta.url);
  const thread = new Worker(script, { execArgv: fromSource ? sourceLoader() : [] });
  return {
    post: (message) => thread.postMessage(message),
    listen: (answer, lost) => {
      thread.on('message', (message: FromTransportWorker) => answer(message));
      thread.on('error', (error) => lost(error.message));
      thread.on('exit', (code) => lost(`ended with code ${code}`));
    },
    end: () => {
      void thread.terminate();
    },
  };
}

// A thread does not inherit the loader of TypeScript source, so it registers its own.
function sourceLoader(): string[] {
  const api = import.meta.resolve('tsx/esm/api');
  const register = `import { register } from ${JSON.stringify(api)}; register();`;
  return ['--import', `data:text/javascript,${encodeURIComponent(register)}`];
}
