/** Directions around an axis: 8192 azimuths at the middles of equal steps, as cosines and sines. */
export const azimuthCount = 8192;

const step = (2 * Math.PI) / azimuthCount;

export const azimuthCosines: Float64Array = Float64Array.from({ length: azimuthCount }, (_, i) =>
  Math.cos((i + 0.5) * step),
);
export const azimuthSines: Float64Array = Float64Array.from({ length: azimuthCount }, (_, i) =>
  Math.sin((i + 0.5) * step),
);
