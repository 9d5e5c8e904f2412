import type { MaterialFamily } from '../../materials/material.js';

/** Families in the order of the cases below; 0 is no hatch. */
const families: readonly MaterialFamily[] = [
  'gas',
  'adipose',
  'soft tissue',
  'bone',
  'lung',
  'liquid',
  'plastic',
  'metal',
  'agent',
  'detector',
];

export const hatchNumber = (family: MaterialFamily | undefined): number =>
  family ? Math.max(0, families.indexOf(family)) : 0;

/**
 * Section hatches drawn by the graphics card, crisp at any zoom: how much ink, 0 to 1, a family has
 * at a place in px of the unzoomed drawing. Pens keep their width on the page.
 */
export const hatchShader = /* glsl */ `
uniform float pixelRatio;

float penned(float away, float unit, float width_px) {
  return 1.0 - smoothstep(-0.5, 0.5, away / unit - 0.5 * width_px * pixelRatio);
}
float lines(float v, float period, float width_px) {
  return penned(abs(mod(v + 0.5 * period, period) - 0.5 * period), fwidth(v), width_px);
}
float lattice(vec2 p, vec2 offset, float period) {
  return length(mod(p - offset + 0.5 * period, period) - 0.5 * period);
}
float hatch(int family, vec2 p) {
  float unit = max(fwidth(p.x), fwidth(p.y));
  float rising = (p.x + p.y) * 0.70711;
  float falling = (p.x - p.y) * 0.70711;
  if (family == 1) {
    float away = min(lattice(p, vec2(2.0), 9.0), lattice(p, vec2(6.5), 9.0));
    return 0.5 * penned(away, unit, 1.6);
  }
  if (family == 2) return 0.36 * lines(falling, 9.0, 0.6);
  if (family == 3) return 0.36 * max(lines(falling, 6.0, 0.6), lines(rising, 6.0, 0.6));
  if (family == 4) {
    float away = min(lattice(p, vec2(4.0), 14.0), lattice(p, vec2(11.0), 14.0));
    return 0.4 * penned(abs(away - 2.4), unit, 0.6);
  }
  if (family == 5) {
    float odd = step(0.5, fract(floor((p.y + 2.5) / 5.0) * 0.5));
    float drawn = step(mod(p.x + 5.0 * odd, 10.0), 5.5);
    return 0.4 * drawn * lines(p.y, 5.0, 0.6);
  }
  if (family == 6) return 0.36 * max(lines(rising, 10.0, 0.6), lines(rising - 2.5, 10.0, 0.6));
  if (family == 7) return 0.65 * lines(falling, 3.5, 1.1);
  if (family == 8) {
    float away = min(lattice(p, vec2(1.2), 5.0), lattice(p, vec2(3.7), 5.0));
    return 0.55 * penned(away, unit, 1.8);
  }
  if (family == 9) return 0.6 * lines(p.x, 2.5, 1.2);
  return 0.0;
}
`;
