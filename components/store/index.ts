// The case on the desk: documents and paths, undo, changes, files, and what is kept in the browser.

export * from './autosave.js';
export * from './case-files.js';
export * from './case-store.js';
export * from './draft.js';
export * from './file-fault.js';
export * from './history.js';
export * from './keep-soon.js';
export * from './layer-changes.js';
export * from './list-changes.js';
export * from './pair-changes.js';
export * from './path.js';
export * from './save-table.js';
export * from './stand-in.js';
export * from './technique-changes.js';
export * from './unless-left.js';
