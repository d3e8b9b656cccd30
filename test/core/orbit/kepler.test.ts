import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  eccentricFromMean,
  eccentricFromTrue,
  meanFromTrue,
  trueFromEccentric,
  trueFromMean,
} from '../../../core/orbit/kepler';

const eccentricity = fc.oneof(
  fc.double({ min: 0, max: 0.999999, noNaN: true }),
  fc.constantFrom(0, 1e-12, 0.5, 0.99, 0.999999999),
);
const angle = fc.double({ min: -20, max: 20, noNaN: true });

describe("Kepler's equation", () => {
  it('is met to machine precision for every eccentricity below 1', () => {
    fc.assert(
      fc.property(angle, eccentricity, (mean, e) => {
        const anomaly = eccentricFromMean(mean, e);
        expect(Math.abs(anomaly - e * Math.sin(anomaly) - mean)).toBeLessThan(1e-14 * (1 + Math.abs(mean)));
      }),
      { numRuns: 5000 },
    );
  });

  it('keeps relative digits near perigee of an almost parabolic orbit', () => {
    const e = 1 - 1e-9;
    const anomaly = 1e-5;
    const series = anomaly ** 3 / 6 - anomaly ** 5 / 120;
    const mean = (1 - e) * anomaly + e * series;
    expect(eccentricFromMean(mean, e) / anomaly).toBeCloseTo(1, 12);
  });

  it('returns true anomalies on the same revolution, and back', () => {
    fc.assert(
      fc.property(angle, fc.double({ min: 0, max: 0.95, noNaN: true }), (mean, e) => {
        const trueAnomaly = trueFromMean(mean, e);
        expect(Math.abs(trueAnomaly - mean)).toBeLessThan(Math.PI);
        expect(meanFromTrue(trueAnomaly, e)).toBeCloseTo(mean, 10);
        const eccentric = eccentricFromTrue(trueAnomaly, e);
        expect(trueFromEccentric(eccentric, e)).toBeCloseTo(trueAnomaly, 10);
      }),
    );
  });

  it.each([1, -0.1, Number.NaN, Number.POSITIVE_INFINITY])('refuses e = %s', (e) => {
    expect(() => eccentricFromMean(1, e)).toThrow(/0 ≤ e < 1/);
  });

  it('refuses an anomaly that is not finite', () => {
    expect(() => eccentricFromMean(Number.NaN, 0.1)).toThrow(/mean anomaly/);
  });
});
