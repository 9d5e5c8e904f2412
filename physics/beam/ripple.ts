const phases = 8;

/**
 * Voltages over one half period of a rippling supply, equally weighted at constant current:
 * V = kVp [1 − r/2 + (r/2) cosφ] at 8 midpoints of φ in (0, π).
 *
 * @param ripple_percent r = (Vmax − Vmin)/Vmax, 0 to 100; 0 yields the one voltage kVp
 * @example rippleVoltages_kV(80, 0) // [80]
 */
export function rippleVoltages_kV(potential_kV: number, ripple_percent: number): number[] {
  if (ripple_percent === 0) return [potential_kV];
  const half = ripple_percent / 200;
  return Array.from(
    { length: phases },
    (_, k) => potential_kV * (1 - half + half * Math.cos(((k + 0.5) * Math.PI) / phases)),
  );
}
