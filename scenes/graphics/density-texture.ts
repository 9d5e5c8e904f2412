import { DataTexture, LinearFilter, RedFormat, UnsignedByteType } from 'three';
import { densitySteps } from '../density-rows.js';

/** Rows of ink densities as a texture the beam looks its ink up in. */
export function densityTexture(rows: readonly (readonly number[])[]): DataTexture {
  const data = Uint8Array.from(rows.flat(), (density) => Math.round(255 * density));
  const texture = new DataTexture(data, densitySteps, rows.length, RedFormat, UnsignedByteType);
  texture.minFilter = LinearFilter;
  texture.magFilter = LinearFilter;
  texture.needsUpdate = true;
  return texture;
}
