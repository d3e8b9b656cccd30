/**
 * β and shadow against a direct count: the orbit integrated by odex in a field of J2 and J4, the Sun of astronomy-engine, and
 * the discs of Sun and body laid over each other as seen from the spacecraft, every ten seconds of one revolution.
 */
import { Body as Celestial, GeoVector } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';
import {
  betaRad,
  circularEclipseShare,
  eclipse,
  type MeanElements,
  periods,
  stateFromMean,
  sunPosition,
} from '../../core/index';
import { meanOfDateFromJ2000, type Vec3 } from './skyOracle';
import { cutField } from './truth/fields';
import { integrateTo, noIntegrands, startOf } from './truth/integrate';

const { body, field } = cutField(4);
const astronomicalUnitKm = 149_597_870.7;
const sunRadiusKm = 695_700;
const radPerDeg = Math.PI / 180;
const stepS = 10;

/** 1 % or 5 s, whichever is more: the promise. Measured worst cases are printed. */
const allowedS = (truthS: number) => Math.max(5, 0.01 * truthS);
/** The series' own 0.01° of the Sun. */
const betaDeg = 0.0105;

function sunKm(date: Date): Vec3 {
  const { x, y, z } = GeoVector(Celestial.Sun, date, true);
  const rows = meanOfDateFromJ2000(date);
  const along = (row: Vec3) => astronomicalUnitKm * (row[0] * x + row[1] * y + row[2] * z);
  return [along(rows[0]), along(rows[1]), along(rows[2])];
}

const dotOf = (a: readonly number[], b: readonly number[]) =>
  a.reduce((sum, part, index) => sum + part * (b[index] ?? Number.NaN), 0);
const lengthOf = (a: readonly number[]) => Math.sqrt(dotOf(a, a));

/** Angle between the centres of Sun and body as seen from a position, less what hides it wholly, and less what touches it. */
function hidden(position: readonly number[], sun: Vec3): { wholly: number; partly: number } {
  const toSun = sun.map((part, index) => part - (position[index] ?? Number.NaN));
  const cosine = -dotOf(toSun, position) / (lengthOf(toSun) * lengthOf(position));
  const apart = Math.acos(Math.max(-1, Math.min(1, cosine)));
  const bodySize = Math.asin(body.equatorialRadiusKm / lengthOf(position));
  const sunSize = Math.asin(sunRadiusKm / lengthOf(toSun));
  return { wholly: apart - bodySize + sunSize, partly: apart - bodySize - sunSize };
}

/** Time (s) that a sampled function spends below zero, its crossings by straight lines between samples. */
function timeBelow(values: readonly number[], spacingS: number): number {
  let below = 0;
  for (let index = 0; index + 1 < values.length; index += 1) {
    const [a, b] = [values[index] ?? Number.NaN, values[index + 1] ?? Number.NaN];
    if (a < 0 && b < 0) below += 1;
    else if (a * b < 0) below += Math.min(a, b) / (Math.min(a, b) - Math.max(a, b));
  }
  return below * spacingS;
}

/** Mean anomaly at which the Sun is hidden most. */
function deepestRad(mean: MeanElements, sun: Vec3): number {
  const depth = (meanAnomalyRad: number) =>
    hidden(stateFromMean(body, { ...mean, meanAnomalyRad }).positionKm, sun).wholly;
  const anomalies = Array.from({ length: 720 }, (_, index) => (index * Math.PI) / 360);
  return anomalies.reduce((best, each) => (depth(each) < depth(best) ? each : best));
}

function counted(mean: MeanElements, date: Date): { umbraS: number; penumbraS: number } {
  const sun = sunKm(date);
  const period = periods(body, mean, 'second').nodalS;
  const count = Math.ceil(period / stepS);
  const wholly: number[] = [];
  const partly: number[] = [];
  // The elements are those of the deepest shadow, where node and perigee are asked for; they drift on within the revolution.
  let motion = startOf(stateFromMean(body, { ...mean, meanAnomalyRad: deepestRad(mean, sun) }));
  for (let index = 0; index <= count; index += 1) {
    motion = integrateTo(field, motion, period * (index / count - 0.5), noIntegrands);
    const seen = hidden(motion.positionKm, sun);
    wholly.push(seen.wholly);
    partly.push(seen.partly);
  }
  const umbraS = timeBelow(wholly, period / count);
  return { umbraS, penumbraS: timeBelow(partly, period / count) - umbraS };
}

const cases = [
  { name: 'Sun-synchronous, 10:30', a: 6928, e: 0.001, i: 97.6, node: 60, perigee: 90, date: '2027-03-21' },
  { name: 'Sun-synchronous, 06:00', a: 7178, e: 0.001, i: 98.6, node: 10, perigee: 90, date: '2027-06-21' },
  { name: 'low, near the equator', a: 6878, e: 0.0005, i: 5, node: 200, perigee: 0, date: '2028-01-10' },
  { name: 'low, 51.6°', a: 6780, e: 0.001, i: 51.6, node: 120, perigee: 40, date: '2030-09-01' },
  { name: 'low, 51.6°, β near its limit', a: 6780, e: 0.001, i: 51.6, node: 172, perigee: 40, date: '2027-06-21' },
  { name: 'low, 51.6°, short eclipse', a: 6780, e: 0.001, i: 51.6, node: 162, perigee: 40, date: '2027-06-21' },
  { name: 'low, 51.6°, grazing', a: 6780, e: 0.001, i: 51.6, node: 163.3, perigee: 40, date: '2027-06-21' },
  { name: 'low, 51.6°, penumbra alone', a: 6780, e: 0.001, i: 51.6, node: 164, perigee: 40, date: '2027-06-21' },
  { name: 'retrograde, 120°', a: 7400, e: 0.02, i: 120, node: 300, perigee: 200, date: '2031-11-11' },
  { name: 'transfer ellipse, apogee in shadow', a: 24_400, e: 0.72, i: 28, node: 10, perigee: 250, date: '2027-01-05' },
  { name: 'transfer ellipse, perigee in shadow', a: 24_400, e: 0.72, i: 28, node: 10, perigee: 90, date: '2027-01-05' },
  { name: '12 hours, 63.4°', a: 26_554, e: 0.72, i: 63.4, node: 80, perigee: 270, date: '2029-04-04' },
  { name: 'geosynchronous at equinox', a: 42_166, e: 0.0003, i: 0.1, node: 100, perigee: 0, date: '2027-03-21' },
  {
    name: 'geosynchronous, edge of the season',
    a: 42_166,
    e: 0.0003,
    i: 0.1,
    node: 100,
    perigee: 0,
    date: '2027-04-11',
  },
  { name: 'medium, 55°', a: 26_560, e: 0.01, i: 55, node: 0, perigee: 30, date: '2027-03-25' },
] as const;

describe('β and shadow against a count along the integrated orbit', () => {
  it.each(cases)('$name', ({ name, a, e, i, node, perigee, date: text }) => {
    const date = new Date(`${text}T00:00:00Z`);
    const jd = 2_440_587.5 + date.getTime() / 86_400_000;
    const mean: MeanElements = {
      semiMajorAxisKm: a,
      eccentricity: e,
      inclinationRad: i * radPerDeg,
      nodeRad: node * radPerDeg,
      perigeeRad: perigee * radPerDeg,
      meanAnomalyRad: 0,
    };
    const sun = sunKm(date);
    const normal = [
      Math.sin(mean.inclinationRad) * Math.sin(mean.nodeRad),
      -Math.sin(mean.inclinationRad) * Math.cos(mean.nodeRad),
      Math.cos(mean.inclinationRad),
    ];
    const trueBetaDeg = Math.asin(dotOf(normal, sun) / lengthOf(sun)) / radPerDeg;
    const truth = counted(mean, date);
    const found = eclipse(body, mean, jd);
    const off = (key: 'umbraS' | 'penumbraS') => found[key] - truth[key];
    console.log(
      `${name}: β ${trueBetaDeg.toFixed(2)}°, umbra ${truth.umbraS.toFixed(1)} s, off by ${off('umbraS').toFixed(2)} s; ` +
        `penumbra ${truth.penumbraS.toFixed(1)} s, off by ${off('penumbraS').toFixed(2)} s`,
    );
    expect.soft(Math.abs(betaRad(body, mean, jd) / radPerDeg - trueBetaDeg)).toBeLessThan(betaDeg);
    expect.soft(Math.abs(off('umbraS'))).toBeLessThan(allowedS(truth.umbraS));
    expect.soft(Math.abs(off('penumbraS'))).toBeLessThan(allowedS(truth.penumbraS));
  });
});

describe('published shadow of a low orbit', () => {
  // A student project's document: 550 km above R 6371, β = 0: 35.7 min, 37.3 % of the revolution. 1 %, with their cylinder.
  it('is 35.7 min and 37.3 % at 550 km and β 0', () => {
    const small = { ...body, equatorialRadiusKm: 6371 };
    const jd = 2_461_193;
    const plane = { eccentricity: 0, inclinationRad: Math.PI / 2, perigeeRad: 0, meanAnomalyRad: 0 };
    // A polar plane through the Sun.
    const nodeRad = sunPosition(jd).rightAscensionRad;
    const mean: MeanElements = { ...plane, semiMajorAxisKm: 6921, nodeRad };
    expect(Math.abs(betaRad(small, mean, jd))).toBeLessThan(1e-12);
    const { umbraS } = eclipse(small, mean, jd);
    const share = umbraS / periods(small, mean, 'second').nodalS;
    console.log(`550 km: umbra ${(umbraS / 60).toFixed(2)} min, ${(100 * share).toFixed(2)} %`);
    expect(Math.abs(umbraS / 60 / 35.7 - 1)).toBeLessThan(0.01);
    expect(Math.abs(share / 0.373 - 1)).toBeLessThan(0.01);
    expect(Math.abs(circularEclipseShare({ radiusKm: 6371, heightKm: 550, betaRad: 0 }) / 0.373 - 1)).toBeLessThan(
      0.01,
    );
  });
});
