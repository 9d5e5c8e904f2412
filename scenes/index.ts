/** Scenes of the stack in the order they are made: data, layout, view, drawing, picture. */

export * from './along-beam.js';
export * from './density-rows.js';
export * from './drawing/stack-drawing.js';
export * from './ink-scale.js';
export * from './inks.js';
export * from './page-scale.js';
export * from './projection.js';
export * from './stack-anchors.js';
export * from './stack-layout.js';
export * from './stack-picture.js';
export * from './stack-scene-data.js';
export * from './step-profile.js';
export * from './view.js';
export * from './view-presets.js';
