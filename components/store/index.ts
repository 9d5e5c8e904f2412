export * from './path.js';
export * from './history.js';
export * from './draft.js';
export * from './technique-changes.js';
export * from './layer-changes.js';
