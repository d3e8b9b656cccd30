import { describe, expect, it } from 'vitest';
import {
  type Body,
  bodies,
  type ChartCondition,
  type ChartShape,
  chartCurve,
  chartFloor,
  chartLine,
  chartRepeats,
  chartShapeOf,
  eccentricityAt,
  secularRates,
} from '../../../core/index';

const { earth, mars, venus } = bodies;
const circle: ChartShape = { kind: 'eccentricity', eccentricity: 0.001 };
const heldPerigee: ChartShape = { kind: 'perigeeAltitude', km: 600 };
const day = 86_400;
const deg = Math.PI / 180;
const sun = 2 * Math.PI;

function ratesOf(body: Body, shape: ChartShape, altitudeKm: number, inclinationRad: number) {
  const eccentricity = eccentricityAt(body, shape, altitudeKm) ?? Number.NaN;
  const semiMajorAxisKm = body.equatorialRadiusKm + altitudeKm;
  const mean = { semiMajorAxisKm, eccentricity, inclinationRad, nodeRad: 0, perigeeRad: 0, meanAnomalyRad: 0 };
  return secularRates(body, mean, 'second');
}

function curveOf(shape: ChartShape, condition: ChartCondition, body = earth) {
  const curve = chartCurve(body, shape, condition);
  if (!curve) throw new Error('a curve was expected');
  return curve;
}

describe('curves of the rate chart', () => {
  it.each([circle, heldPerigee])(
    'Sun-synchronous: the node moves with the mean Sun at every altitude (%o)',
    (shape) => {
      const curve = curveOf(shape, { kind: 'sunSynchronous' });
      const wanted = sun / ((earth.yearDays ?? 0) * day);
      for (const km of [620, 900, 1500, 3000, 5000]) {
        const rad = curve.inclinationAt?.(km) ?? Number.NaN;
        expect(ratesOf(earth, shape, km, rad).nodeRadPerS / wanted).toBeCloseTo(1, 13);
        expect(curve.altitudeAt?.(rad)).toBeCloseTo(km, 6);
      }
    },
  );

  it('Sun-synchronous circles end over the equator, backwards, near the height of first order', () => {
    const { endAltitudeKm, inclinationAt } = curveOf(
      { kind: 'eccentricity', eccentricity: 0 },
      { kind: 'sunSynchronous' },
    );
    // a^(7/2) = (3/2) J2 R² √μ / rate, by hand from the constants of EGM2008: 5974 km up. Second order adds parts of J2.
    expect(Math.abs((endAltitudeKm ?? 0) - 5974)).toBeLessThan(10);
    expect(inclinationAt?.((endAltitudeKm ?? 0) - 0.01)).toBeGreaterThan(179 * deg);
    expect(inclinationAt?.((endAltitudeKm ?? 0) + 1)).toBeNull();
  });

  it('equal node rates: the rate is the one asked for, on either side of 90°', () => {
    for (const degPerDay of [-7, -3, -0.5, 0.5, 3, 7]) {
      const radPerS = (degPerDay * deg) / day;
      const curve = curveOf(circle, { kind: 'nodeRate', radPerS });
      const rad = curve.inclinationAt?.(400) ?? Number.NaN;
      expect(rad > Math.PI / 2).toBe(degPerDay > 0);
      expect(ratesOf(earth, circle, 400, rad).nodeRadPerS / radPerS).toBeCloseTo(1, 13);
    }
  });

  it('critical inclination: the perigee stands still on both sides', () => {
    for (const side of [-1, 1] as const) {
      const curve = curveOf(circle, { kind: 'critical', side });
      const rad = curve.inclinationAt?.(700) ?? Number.NaN;
      expect(rad / deg).toBeCloseTo(90 + side * 26.565, 0);
      const rates = ratesOf(earth, circle, 700, rad);
      expect(Math.abs(rates.perigeeRadPerS / ratesOf(earth, circle, 700, 0).perigeeRadPerS)).toBeLessThan(1e-13);
    }
  });

  it.each([circle, heldPerigee])(
    'repeat tracks: N nodal periods fill D nodal days at every inclination (%o)',
    (shape) => {
      const [revolutions, days] = [27, 2];
      const curve = curveOf(shape, { kind: 'repeat', revolutions, days });
      for (const inclination of [0, 30, 63.4, 90, 98, 150, 180]) {
        const km = curve.altitudeAt?.(inclination * deg) ?? Number.NaN;
        const { nodeRadPerS, perigeeRadPerS, meanAnomalyRadPerS } = ratesOf(earth, shape, km, inclination * deg);
        const turns = (meanAnomalyRadPerS + perigeeRadPerS) / ((earth.rotationRadPerS ?? 0) - nodeRadPerS);
        expect((turns * days) / revolutions).toBeCloseTo(1, 12);
      }
    },
  );

  it('has no curve where the body lacks what it needs', () => {
    const lacking: Body = { ...mars, yearDays: null, rotationRadPerS: null };
    expect(chartCurve(lacking, circle, { kind: 'sunSynchronous' })).toBeNull();
    expect(chartCurve(lacking, circle, { kind: 'repeat', revolutions: 12, days: 1 })).toBeNull();
    const round: Body = { ...earth, zonals: [0, 0] };
    expect(chartCurve(round, circle, { kind: 'critical', side: 1 })).toBeNull();
  });

  it.each([
    [0, 1],
    [14, 0],
    [14.5, 1],
    [-14, 1],
    [14, Number.NaN],
    [Number.POSITIVE_INFINITY, 1],
  ])('has no repeat track of %d revolutions in %d days', (revolutions, days) => {
    expect(chartCurve(earth, circle, { kind: 'repeat', revolutions, days })).toBeNull();
  });
});

describe('what a chart holds', () => {
  it('an ellipse has its floor where perigee touches the surface', () => {
    const shape = chartShapeOf(earth, { semiMajorAxisKm: 26_554, eccentricity: 0.74 }, 'eccentricity');
    const { altitudeKm, because } = chartFloor(earth, shape);
    expect(because).toBe('surface');
    expect((altitudeKm + earth.equatorialRadiusKm) * (1 - 0.74)).toBeCloseTo(earth.equatorialRadiusKm, 6);
  });

  it('a held perigee has its floor at the circle', () => {
    expect(chartFloor(earth, heldPerigee)).toEqual({ altitudeKm: 600, because: 'circle' });
    expect(eccentricityAt(earth, heldPerigee, 600)).toBe(0);
    expect(eccentricityAt(earth, heldPerigee, 599)).toBeNull();
    const e = eccentricityAt(earth, heldPerigee, 900) ?? Number.NaN;
    expect((earth.equatorialRadiusKm + 900) * (1 - e) - earth.equatorialRadiusKm).toBeCloseTo(600, 9);
  });

  it('a held perigee underground leaves no orbit', () => {
    expect(chartFloor(earth, { kind: 'perigeeAltitude', km: -1 }).altitudeKm).toBe(Number.POSITIVE_INFINITY);
  });
});

const window = { fromRad: 0, toRad: Math.PI, fromKm: -50, toKm: 1600 };

describe('lines and the choice of repeat tracks', () => {
  it('a line stays in the window and on its curve', () => {
    const curve = curveOf(circle, { kind: 'sunSynchronous' });
    const line = chartLine(earth, circle, curve, window);
    expect(Math.min(...line.altitudeKm)).toBeCloseTo(chartFloor(earth, circle).altitudeKm, 9);
    expect(Math.max(...line.altitudeKm)).toBeCloseTo(1600, 9);
    line.altitudeKm.forEach((km, index) => {
      expect(line.inclinationRad[index]).toBe(curve.inclinationAt?.(km));
    });
  });

  it('a line that ends in the window reaches its end', () => {
    const curve = curveOf(circle, { kind: 'sunSynchronous' });
    const line = chartLine(earth, circle, curve, { ...window, toKm: 8000 });
    expect(line.altitudeKm[0]).toBeCloseTo(curve.endAltitudeKm ?? 0, 9);
    expect(line.inclinationRad[0]).toBeGreaterThan(179.9 * deg);
  });

  it('shortest cycles come first and keep their distance', () => {
    const found = chartRepeats(earth, circle, window, { gapKm: 70, most: 9 });
    const names = found.map(({ condition }) =>
      condition.kind === 'repeat' ? `${condition.revolutions}/${condition.days}` : '',
    );
    expect(names.slice(0, 4).sort()).toEqual(['13/1', '14/1', '15/1', '16/1']);
    const heights = found.map(({ altitudeAt }) => altitudeAt?.(0) ?? Number.NaN).sort((one, other) => one - other);
    for (let index = 1; index < heights.length; index += 1) {
      expect((heights[index] ?? 0) - (heights[index - 1] ?? 0)).toBeGreaterThanOrEqual(70);
    }
  });

  it('a close look finds longer cycles', () => {
    const close = { fromRad: 96 * deg, toRad: 99 * deg, fromKm: 560, toKm: 580 };
    expect(chartRepeats(earth, circle, close, { gapKm: 1, most: 9 }).length).toBeGreaterThanOrEqual(3);
  });

  it('a body that hardly turns has none', () => {
    expect(chartRepeats(venus, circle, window, { gapKm: 70, most: 9 })).toEqual([]);
  });
});
