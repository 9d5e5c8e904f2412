import { parentPort } from 'node:worker_threads';
import { transportHost } from './transport-host.js';
import type { ToTransportWorker } from './transport-messages.js';

const port = parentPort;
if (port) {
  const take = transportHost((message, transfer) => port.postMessage(message, transfer));
  port.on('message', (message: ToTransportWorker) => take(message));
}
