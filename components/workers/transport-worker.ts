import { transportHost } from './transport-host.js';
import type { ToTransportWorker } from './transport-messages.js';

const scope = globalThis as unknown as DedicatedWorkerGlobalScope;
const take = transportHost((message, transfer) => scope.postMessage(message, transfer));
scope.onmessage = ({ data }: MessageEvent<ToTransportWorker>) => take(data);
