import { expose } from 'comlink';
import { evaluationHost } from './evaluation-host.js';

expose(evaluationHost());
