import { sweepHost } from './sweep-host.js';
import type { ToSweepWorker } from './sweep-messages.js';

const scope = globalThis as unknown as DedicatedWorkerGlobalScope;
const take = sweepHost((message) => scope.postMessage(message));
scope.onmessage = ({ data }: MessageEvent<ToSweepWorker>) => take(data);
