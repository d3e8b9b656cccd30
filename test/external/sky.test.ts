import { Body as Celestial, e_tilt, GeoVector, MakeTime, SiderealTime } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';
import {
  equationOfTimeS,
  meanSiderealTimeRad,
  precessionMatrix,
  stateToMeanOfDate,
  sunPosition,
  transform,
} from '../../core/index';
import {
  angleBetweenDeg,
  julianDateOf,
  meanOfDateFromJ2000,
  spreadDates,
  trueOfDateFromJ2000,
  type Vec3,
  wrapPi,
} from './skyOracle';

/**
 * Sky and time against astronomy-engine 2.1.19 (full VSOP87 Sun, IAU 2006 precession, its own
 * ΔT), 1980 to 2060. Measured worst cases in brackets.
 */
const tolerances = {
  // The same IAU 2006 formula; a Julian date is good to 0.04 ms [0.00002 s].
  meanSiderealTimeS: 0.0001,
  // The equation of the equinoxes, left out by design: 17.2″ cos ε of longitude is 1.06 s, shorter terms add [1.15 s].
  apparentSiderealTimeS: 1.25,
  // Meeus promises 0.01° for these formulas, which leave out the pull of Moon and planets [0.0093°;
  // 0.0098° where 48 000 dates of the span were tried once].
  sunDirectionDeg: 0.0105,
  // The same omission: the Earth circles the common centre with the Moon at 3e-5 au, planets add [7.7e-5].
  sunDistanceShare: 1e-4,
  // 0.01° of longitude is up to 0.011° of right ascension (1/cos ε at the solstices), or 2.6 s [2.38 s].
  equationOfTimeS: 2.7,
  // Both use IAU 2006, in different sets of angles fitted to each other [7e-11°].
  precessionDeg: 1e-9,
  // Nutation, left out by design: 9.2″ of obliquity and 17.2″ of longitude, shorter terms add; 0.0055° in any direction.
  precessionAgainstTrueDeg: 0.0055,
  // The equation of the equinoxes as a turn, 1.15 s of time [0.0048°].
  earthFixedDeg: 0.0053,
} as const;

const twoPi = 2 * Math.PI;
const dates = spreadDates(1000);

function worst(measure: (date: Date) => number): number {
  return Math.max(...dates.map((date) => Math.abs(measure(date))));
}

function unit([x, y, z]: Vec3): Vec3 {
  const length = Math.hypot(x, y, z);
  return [x / length, y / length, z / length];
}

/** A direction of J2000 in the mean equator and equinox of date, by the way that states take. */
function meanOfDate(direction: Vec3, date: Date): Vec3 {
  const state = { positionKm: direction, velocityKmPerS: [0, 0, 0] } as const;
  return stateToMeanOfDate(state, { frame: 'j2000', epochJd: julianDateOf(date) }).positionKm;
}

function siderealGapS(date: Date, referenceHours: number): number {
  return (wrapPi(meanSiderealTimeRad(julianDateOf(date)) - (referenceHours / 24) * twoPi) / twoPi) * 86400;
}

function sunOfDate(date: Date): { direction: Vec3; distanceAu: number } {
  const { x, y, z } = GeoVector(Celestial.Sun, date, true);
  const fromCentre = transform(meanOfDateFromJ2000(date), [x, y, z]);
  const distanceAu = Math.hypot(...fromCentre);
  return { direction: unit(fromCentre), distanceAu };
}

describe('sidereal time against astronomy-engine', () => {
  it('agrees with its sidereal time less the equation of the equinoxes', () => {
    const gap = worst((date) => siderealGapS(date, SiderealTime(date) - e_tilt(MakeTime(date)).ee / 3600));
    expect(gap).toBeLessThan(tolerances.meanSiderealTimeS);
  });

  it('differs from its apparent sidereal time by no more than nutation', () => {
    const gap = worst((date) => siderealGapS(date, SiderealTime(date)));
    expect(gap).toBeLessThan(tolerances.apparentSiderealTimeS);
  });
});

describe('the Sun against astronomy-engine', () => {
  it('stands in the same direction', () => {
    const gap = worst((date) =>
      angleBetweenDeg(sunPosition(julianDateOf(date)).directionMeanOfDate, sunOfDate(date).direction),
    );
    expect(gap).toBeLessThan(tolerances.sunDirectionDeg);
  });

  it('is at the same distance', () => {
    const gap = worst(
      (date) => sunPosition(julianDateOf(date)).distanceKm / 149597870.7 / sunOfDate(date).distanceAu - 1,
    );
    expect(gap).toBeLessThan(tolerances.sunDistanceShare);
  });

  it('has the same equation of time, of the same sign', () => {
    const gap = worst((date) => {
      const { direction } = sunOfDate(date);
      const meanTurns = SiderealTime(date) / 24 - e_tilt(MakeTime(date)).ee / 86400 - (julianDateOf(date) % 1);
      const apparentRad = Math.atan2(direction[1], direction[0]);
      const referenceS = (wrapPi(meanTurns * twoPi - apparentRad) / twoPi) * 86400;
      return equationOfTimeS(julianDateOf(date)) - referenceS;
    });
    expect(gap).toBeLessThan(tolerances.equationOfTimeS);
  });
});

describe('precession against astronomy-engine', () => {
  const axes: readonly Vec3[] = [
    [1, 0, 0],
    [0, 1, 0],
    [0, 0, 1],
  ];
  const worstAxis = (ours: (axis: Vec3) => Vec3, theirs: (axis: Vec3) => Vec3) =>
    Math.max(...axes.map((axis) => angleBetweenDeg(ours(axis), theirs(axis))));

  it('agrees once nutation is taken off', () => {
    const gap = worst((date) => {
      const reference = meanOfDateFromJ2000(date);
      return worstAxis(
        (axis) => meanOfDate(axis, date),
        (axis) => transform(reference, axis),
      );
    });
    expect(gap).toBeLessThan(tolerances.precessionDeg);
  });

  it('leads from one date to another as by way of J2000', () => {
    const [from = new Date(0)] = dates.slice(1);
    const gap = worst((date) => {
      const between = precessionMatrix(julianDateOf(from), julianDateOf(date));
      const reference = meanOfDateFromJ2000(date);
      return worstAxis(
        (axis) => transform(between, meanOfDate(axis, from)),
        (axis) => transform(reference, axis),
      );
    });
    expect(gap).toBeLessThan(tolerances.precessionDeg);
  });

  it('differs from its true equator and equinox of date by no more than nutation', () => {
    const gap = worst((date) => {
      const reference = trueOfDateFromJ2000(date);
      return worstAxis(
        (axis) => meanOfDate(axis, date),
        (axis) => transform(reference, axis),
      );
    });
    expect(gap).toBeLessThan(tolerances.precessionAgainstTrueDeg);
  });
});

describe('Earth-fixed against astronomy-engine', () => {
  it('puts the Greenwich meridian where apparent sidereal time does, nutation apart', () => {
    const gap = worst((date) => {
      const fixed = { positionKm: [7000, 0, 0], velocityKmPerS: [0, 0, 0] } as const;
      const { positionKm } = stateToMeanOfDate(fixed, { frame: 'earthFixed', epochJd: julianDateOf(date) });
      const angleRad = (SiderealTime(date) / 24) * twoPi;
      return angleBetweenDeg(unit(positionKm), [Math.cos(angleRad), Math.sin(angleRad), 0]);
    });
    expect(gap).toBeLessThan(tolerances.earthFixedDeg);
  });

  it('gives the velocity that follows from the turning frame', () => {
    const epochJd = julianDateOf(dates[3] ?? new Date());
    const fixed = { positionKm: [5000, 3000, 4000], velocityKmPerS: [0, 0, 0] } as const;
    const halfStepS = 10;
    const at = (offsetS: number) =>
      stateToMeanOfDate(fixed, { frame: 'earthFixed', epochJd: epochJd + offsetS / 86400 }).positionKm;
    const [before, after] = [at(-halfStepS), at(halfStepS)];
    const { velocityKmPerS } = stateToMeanOfDate(fixed, { frame: 'earthFixed', epochJd });
    velocityKmPerS.forEach((value, index) => {
      const difference = ((after[index] ?? Number.NaN) - (before[index] ?? Number.NaN)) / (2 * halfStepS);
      // A Julian date is good to 0.04 ms: 2e-5 km over 20 s is 1e-6 km/s.
      expect(Math.abs(value - difference)).toBeLessThan(3e-6);
    });
  });
});
