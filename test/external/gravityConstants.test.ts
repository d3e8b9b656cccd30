import { describe, expect, it } from 'vitest';
import { bodies, gravitySets } from '../../core/index';

/**
 * Published constants, written out a second time, unnormalised. Tolerances are half a unit of the
 * last digit quoted, or wider where the value is remembered rather than read.
 */
const published = [
  {
    body: gravitySets.EGM2008,
    degree: 2,
    value: 1.0826261738e-3,
    tolerance: 1e-12,
    source: 'EGM2008, Pavlis et al. 2012',
  },
  { body: gravitySets.EGM2008, degree: 3, value: -2.53241e-6, tolerance: 1e-11, source: 'EGM2008, Pavlis et al. 2012' },
  { body: gravitySets.EGM2008, degree: 4, value: -1.6199e-6, tolerance: 1e-10, source: 'EGM2008, Pavlis et al. 2012' },
  {
    body: gravitySets.EGM96,
    degree: 2,
    value: 1.0826266836e-3,
    tolerance: 5e-13,
    source: 'EGM96, Lemoine et al. 1998 (memory)',
  },
  { body: gravitySets.EGM96, degree: 3, value: -2.53266e-6, tolerance: 1e-11, source: 'EGM96 (memory)' },
  { body: gravitySets.EGM96, degree: 4, value: -1.61962e-6, tolerance: 1e-11, source: 'EGM96 (memory)' },
  { body: gravitySets.EGM96, degree: 6, value: 5.40677e-7, tolerance: 1e-11, source: 'EGM96 (memory)' },
  { body: gravitySets.WGS84, degree: 2, value: 1.08262982e-3, tolerance: 5e-12, source: 'NIMA TR 8350.2, 3rd edition' },
  { body: gravitySets.WGS72, degree: 2, value: 1.082616e-3, tolerance: 1e-15, source: 'Spacetrack Report no. 3' },
  { body: bodies.moon, degree: 2, value: 2.033e-4, tolerance: 2e-7, source: 'Williams et al. 2014 (memory)' },
  {
    body: bodies.mars,
    degree: 2,
    value: 1.9566e-3,
    tolerance: 5e-8,
    source: 'Konopliv et al. 2016, R 3396.0 (second-hand)',
  },
  { body: bodies.mars, degree: 3, value: 3.145e-5, tolerance: 5e-8, source: 'Konopliv et al. 2016 (second-hand)' },
  { body: bodies.venus, degree: 2, value: 4.4044e-6, tolerance: 5e-11, source: 'Konopliv et al. 1999, R 6051.0' },
  { body: bodies.jupiter, degree: 2, value: 1.46966e-2, tolerance: 1e-6, source: 'Iess et al. 2018 (memory)' },
  { body: bodies.saturn, degree: 2, value: 1.62906e-2, tolerance: 1e-6, source: 'Iess et al. 2019 (memory)' },
] as const;

const parameters = [
  { body: gravitySets.EGM2008, muKm3PerS2: 398600.4415, radiusKm: 6378.1363, source: 'Pavlis et al. 2012' },
  { body: gravitySets.WGS84, muKm3PerS2: 398600.4418, radiusKm: 6378.137, source: 'NIMA TR 8350.2' },
  { body: gravitySets.WGS72, muKm3PerS2: 398600.8, radiusKm: 6378.135, source: 'Spacetrack Report no. 3' },
  { body: bodies.moon, muKm3PerS2: 4902.80007, radiusKm: 1738, source: 'Williams et al. 2014' },
  {
    body: bodies.mars,
    muKm3PerS2: 42828.37581,
    radiusKm: 3396,
    source: 'Konopliv et al. 2016; 4.305e4 circulates and is wrong',
  },
  { body: bodies.venus, muKm3PerS2: 324858.592, radiusKm: 6051, source: 'Konopliv et al. 1999' },
] as const;

describe('gravity constants against their sources', () => {
  it.each(published)('$body.name $body.gravitySet J$degree: $source', ({ body, degree, value, tolerance }) => {
    expect(Math.abs((body.zonals[degree] ?? Number.NaN) - value)).toBeLessThanOrEqual(tolerance);
  });

  it.each(parameters)('$body.name $body.gravitySet μ and radius: $source', ({ body, muKm3PerS2, radiusKm }) => {
    expect(body.muKm3PerS2).toBe(muKm3PerS2);
    expect(body.radiusKm).toBe(radiusKm);
  });

  it('keeps the WGS 84 set within the uncertainty between tide systems of the EGM sets', () => {
    // The permanent tide is 4.2e-9 of J2 (IERS Conventions 2010, §6.2.2).
    for (const degree of [2, 3, 4, 5, 6]) {
      const gap = (gravitySets.WGS84.zonals[degree] ?? Number.NaN) - (gravitySets.EGM2008.zonals[degree] ?? Number.NaN);
      expect(Math.abs(gap)).toBeLessThan(5e-9);
    }
  });
});
