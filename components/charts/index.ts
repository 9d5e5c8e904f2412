// Charts: data in, SVG out, with or without a browser.

export { type DoseCurveData, doseCurve } from './dose-curve.js';
export { doseCurveTable } from './dose-curve-table.js';
export { ratioBar } from './ratio-bar.js';
export { sectionDrawing } from './section-drawing.js';
export { spectrumChart } from './spectrum-chart.js';
