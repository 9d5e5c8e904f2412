import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { acquisitionSchema, tubeSchema } from '../../physics/case/schema.js';
import {
  powerAvailable_kW,
  shortestExposureTime_ms,
  splitTubeLoad,
} from '../../physics/exposure.js';

const tube = tubeSchema.parse({});
const rated = tubeSchema.parse({
  rating: [
    { exposureTime_ms: 10, power_kW: 80 },
    { exposureTime_ms: 100, power_kW: 60 },
    { exposureTime_ms: 1000, power_kW: 30 },
  ],
});

describe('splitting a tube load into current and time', () => {
  it('keeps the time that the acquisition fixes', () => {
    const acquisition = acquisitionSchema.parse({ fixed: { exposureTime_ms: 80 } });
    const exposure = splitTubeLoad(tube, acquisition, 70, 40);
    expect(exposure).toEqual({
      tubeLoad_mAs: 40,
      tubeCurrent_mA: 500,
      exposureTime_ms: 80,
      power_kW: 35,
    });
  });

  it('keeps the current that the acquisition fixes', () => {
    const acquisition = acquisitionSchema.parse({ fixed: { tubeCurrent_mA: 400 } });
    expect(splitTubeLoad(tube, acquisition, 80, 20).exposureTime_ms).toBeCloseTo(50, 12);
  });

  it('uses no more than the available power and never less than the shortest time', () => {
    const acquisition = acquisitionSchema.parse({});
    fc.assert(
      fc.property(
        fc.double({ min: 40, max: 150, noNaN: true }),
        fc.double({ min: 0.01, max: 100, noNaN: true }),
        (potential_kV, load_mAs) => {
          const { power_kW, exposureTime_ms, tubeCurrent_mA } = splitTubeLoad(
            rated,
            acquisition,
            potential_kV,
            load_mAs,
          );
          const longest = exposureTime_ms === rated.exposureTime_ms.max;
          expect(exposureTime_ms).toBeGreaterThanOrEqual(rated.exposureTime_ms.min);
          if (!longest) {
            expect(power_kW).toBeLessThanOrEqual(
              powerAvailable_kW(rated, exposureTime_ms ?? 0) * (1 + 1e-6),
            );
            expect(tubeCurrent_mA).toBeLessThanOrEqual(rated.current_mA.max * (1 + 1e-6));
          }
          expect(((tubeCurrent_mA ?? 0) * (exposureTime_ms ?? 0)) / 1000).toBeCloseTo(load_mAs, 8);
        },
      ),
    );
  });
});

describe('the rating chart', () => {
  it('holds its end rows outside its range and meets its rows', () => {
    expect(powerAvailable_kW(rated, 1)).toBe(80);
    expect(powerAvailable_kW(rated, 100)).toBeCloseTo(60, 12);
    expect(powerAvailable_kW(rated, 5000)).toBe(30);
  });

  it('interpolates in the logarithm of time', () => {
    expect(powerAvailable_kW(rated, Math.sqrt(10 * 100))).toBeCloseTo(70, 12);
  });

  it('lengthens the shortest exposure where power falls with time', () => {
    expect(shortestExposureTime_ms(rated, 80, 50)).toBeGreaterThan(
      shortestExposureTime_ms(tube, 80, 50),
    );
  });
});
