import { describe, expect, it } from 'vitest';
import {
  bodies,
  type ChartCondition,
  type ChartCurve,
  type ChartShape,
  chartCurve,
  crossingNear,
  snapPoint,
  solveOrbit,
} from '../../../core/index';

const { earth } = bodies;
const shape: ChartShape = { kind: 'eccentricity', eccentricity: 0.001 };
const deg = Math.PI / 180;
/** 600 px for 180°, 400 px for 1600 km. */
const scale = { perRad: 600 / Math.PI, perKm: 0.25 };
const reach = { curve: 8, crossing: 14 };

function curveOf(condition: ChartCondition): ChartCurve {
  const curve = chartCurve(earth, shape, condition);
  if (!curve) throw new Error('a curve was expected');
  return curve;
}

const sun = curveOf({ kind: 'sunSynchronous' });
const polar = curveOf({ kind: 'polar' });
const critical = curveOf({ kind: 'critical', side: 1 });
const fourteen = curveOf({ kind: 'repeat', revolutions: 14, days: 1 });
const slow = curveOf({ kind: 'nodeRate', radPerS: (0.5 * deg) / 86_400 });
const curves = [sun, polar, critical, fourteen];
const at = (inclinationDeg: number, altitudeKm: number) => ({ inclinationRad: inclinationDeg * deg, altitudeKm });

describe('snapping', () => {
  it('leaves a point alone that is near nothing, rounded to what can be read out', () => {
    const { point, curves: on } = snapPoint({ at: at(40.123_456, 612.345_6), curves, scale, reach });
    expect(on).toEqual([]);
    expect(point.altitudeKm).toBeCloseTo(612.3, 12);
    expect(point.inclinationRad / deg).toBeCloseTo(40.123, 12);
  });

  it('goes to a steep curve at the altitude of the point', () => {
    const { point, curves: on } = snapPoint({ at: at(98.4, 611.17), curves, scale, reach });
    expect(on).toEqual([sun]);
    expect(Math.abs(point.altitudeKm - 611.17)).toBeLessThan(1);
    expect(point.altitudeKm * 10).toBeCloseTo(Math.round(point.altitudeKm * 10), 9);
    expect(point.inclinationRad).toBe(sun.inclinationAt?.(point.altitudeKm));
  });

  it('goes to a level curve at the inclination of the point', () => {
    const { point, curves: on } = snapPoint({ at: at(30, 842), curves, scale, reach });
    expect(on).toEqual([fourteen]);
    expect(Math.abs(point.inclinationRad / deg - 30)).toBeLessThan(0.2);
    expect(point.altitudeKm).toBe(fourteen.altitudeAt?.(point.inclinationRad));
  });

  it('follows a node rate round its flat end, where no inclination is left above', () => {
    const end = slow.endAltitudeKm ?? 0;
    const { curves: on, point } = snapPoint({
      at: at(178, end + 4),
      curves: [slow],
      scale: { perRad: 190, perKm: 0.02 },
      reach,
    });
    expect(on).toEqual([slow]);
    expect(point.altitudeKm).toBe(slow.altitudeAt?.(point.inclinationRad));
  });

  it('prefers a crossing, and meets what the solver finds for both conditions', () => {
    const { point, curves: on } = snapPoint({ at: at(99, 885), curves, scale, reach });
    expect(new Set(on)).toEqual(new Set([sun, fourteen]));
    const start = {
      semiMajorAxisKm: 7250,
      eccentricity: 0.001,
      inclinationRad: 98 * deg,
      nodeRad: 0,
      perigeeRad: 0,
      meanAnomalyRad: 0,
    };
    const solved = solveOrbit({
      body: earth,
      theory: 'second',
      start,
      free: ['semiMajorAxisKm', 'inclinationRad'],
      conditions: [{ kind: 'sunSynchronous' }, { kind: 'repeat', revolutions: 14, days: 1 }],
    });
    if (!solved.ok) throw new Error('an orbit was expected');
    expect(point.altitudeKm).toBeCloseTo(solved.mean.semiMajorAxisKm - earth.equatorialRadiusKm, 6);
    expect(point.inclinationRad).toBeCloseTo(solved.mean.inclinationRad, 10);
  });

  it('stays on a held curve, and still finds the crossings on it', () => {
    const along = snapPoint({ at: at(70, 700), curves, scale, reach, held: sun });
    expect(along.curves).toEqual([sun]);
    expect(along.point.inclinationRad).toBe(sun.inclinationAt?.(along.point.altitudeKm));
    const cross = snapPoint({ at: at(98.9, 880), curves, scale, reach, held: sun });
    expect(new Set(cross.curves)).toEqual(new Set([sun, fourteen]));
  });

  it('with no reach, moves along a held curve only', () => {
    const none = { curve: 0, crossing: 0 };
    expect(snapPoint({ at: at(98.4, 611.2), curves, scale, reach: none }).curves).toEqual([]);
  });
});

describe('crossings', () => {
  it('are the same whichever curve is named first', () => {
    const one = crossingNear(sun, fourteen, at(98, 800));
    const other = crossingNear(fourteen, sun, at(98, 800));
    expect(one?.altitudeKm).toBeCloseTo(other?.altitudeKm ?? 0, 8);
  });

  it('of Sun-synchronous and critical exist, of polar and critical do not', () => {
    const both = crossingNear(sun, critical, at(115, 3000));
    expect((both?.inclinationRad ?? 0) / deg).toBeCloseTo(116.57, 1);
    expect(sun.inclinationAt?.(both?.altitudeKm ?? 0)).toBeCloseTo(both?.inclinationRad ?? 0, 10);
    expect(crossingNear(polar, critical, at(90, 700))).toBeNull();
  });
});
