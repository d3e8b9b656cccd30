import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bodies } from '../../../core/bodies/bodies';
import { customBody } from '../../../core/bodies/customBody';
import { equationOfTimeS, meanSunRightAscensionRad } from '../../../core/bodies/sun';
import { wrapPi } from '../../../core/numerics/angles';
import { localTimeDriftSPerS, localTimeOfNodeH, nodeFromLocalTimeRad } from '../../../core/orbit/localTime';

const options = fc.record({
  node: fc.constantFrom('ascending' as const, 'descending' as const),
  sun: fc.constantFrom('mean' as const, 'apparent' as const),
});
const anyJd = fc.double({ min: 2433282.5, max: 2488434.5, noNaN: true });

describe('local time of a node', () => {
  it('comes back as the node it was made from', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 6.28, noNaN: true }), anyJd, options, (nodeRad, jd, how) => {
        const hours = localTimeOfNodeH(nodeRad, jd, how);
        expect(hours).toBeGreaterThanOrEqual(0);
        expect(hours).toBeLessThan(24);
        expect(wrapPi(nodeFromLocalTimeRad(hours, jd, how) - nodeRad)).toBeCloseTo(0, 10);
      }),
    );
  });

  it('is noon where the ascending node stands under the mean Sun, midnight at the descending node', () => {
    const jd = 2461120.5;
    const nodeRad = meanSunRightAscensionRad(jd);
    expect(localTimeOfNodeH(nodeRad, jd, { node: 'ascending', sun: 'mean' })).toBeCloseTo(12, 9);
    const descending = localTimeOfNodeH(nodeRad, jd, { node: 'descending', sun: 'mean' });
    expect(Math.min(descending, 24 - descending)).toBeCloseTo(0, 9);
  });

  it('is 15° of node an hour, later to the east', () => {
    const jd = 2461120.5;
    const nodeRad = meanSunRightAscensionRad(jd) - (1.5 * 15 * Math.PI) / 180;
    expect(localTimeOfNodeH(nodeRad, jd, { node: 'ascending', sun: 'mean' })).toBeCloseTo(10.5, 9);
  });

  it('differs between apparent and mean Sun by the equation of time', () => {
    fc.assert(
      fc.property(anyJd, (jd) => {
        const apparent = localTimeOfNodeH(1, jd, { node: 'ascending', sun: 'apparent' });
        const mean = localTimeOfNodeH(1, jd, { node: 'ascending', sun: 'mean' });
        const hours = ((apparent - mean + 36) % 24) - 12;
        expect(hours * 3600).toBeCloseTo(equationOfTimeS(jd), 4);
      }),
    );
  });
});

describe('drift of local time', () => {
  const yearS = 365.2422 * 86400;

  it('is nothing where the node keeps up with the mean Sun', () => {
    expect(localTimeDriftSPerS((2 * Math.PI) / yearS, bodies.earth)).toBeCloseTo(0, 15);
  });

  it('is one day a year backwards where the node stands still', () => {
    expect((localTimeDriftSPerS(0, bodies.earth) ?? 0) * yearS).toBeCloseTo(-86400, 6);
  });

  it('has the other sign on a retrograde rotator', () => {
    expect(localTimeDriftSPerS(0, bodies.venus)).toBeGreaterThan(0);
  });

  it('is unknown without a year or without a rotation', () => {
    const plain = { name: 'Skerry', muKm3PerS2: 1000, radiusKm: 500, zonals: [0, 0, 1e-3] };
    expect(localTimeDriftSPerS(0, customBody({ ...plain, rotationRadPerS: 1e-4 }))).toBeNull();
    expect(localTimeDriftSPerS(0, customBody({ ...plain, yearDays: 100 }))).toBeNull();
  });
});
