import { describe, expect, it } from 'vitest';
import { bodies, driftHeadline, firstOrderSentence, type ResolvedOrbit } from '../../../core/index';

const rad = Math.PI / 180;
const orbit = (inclinationDeg: number, part: Partial<ResolvedOrbit> = {}): ResolvedOrbit => ({
  body: bodies.earth,
  mean: {
    kind: 'mean',
    semiMajorAxisKm: 6946,
    eccentricity: 0.001,
    inclinationRad: inclinationDeg * rad,
    nodeRad: 0,
    perigeeRad: 0,
    meanAnomalyRad: 0,
  },
  epochJd: null,
  theory: 'Brouwer',
  origin: 'altitudes',
  typedAs: 'mean',
  ...part,
});
const textOf = (of: ResolvedOrbit, unit: 'degPerDay' | 'degPerYear' = 'degPerDay') =>
  driftHeadline(of, unit)
    .map(({ text }) => text)
    .join('');

describe('the answer of Drift', () => {
  it('is one line about rates now', () => {
    expect(textOf(orbit(97.66))).toMatch(
      /^Node moves \+0\.98\d\d° a day, perigee \u22123\.\d{4}°\. Local time drifts [+\u2212]\d+\.\d ± 0\.3 min a year at today’s rate\.$/,
    );
  });

  it('speaks of years where the user asked for them', () => {
    expect(textOf(orbit(97.66), 'degPerYear')).toMatch(/^Node moves \+3\d\d\.\d\d° a year, /);
  });

  it('says how soon a local time that runs has gone round the clock', () => {
    expect(textOf(orbit(51.6))).toMatch(
      /Local time drifts \u2212\d+\.\d( ± \d\.\d)? min a day, once round in \d+\.\d days\.$/,
    );
  });

  it('says what local time lacks on a body without a year', () => {
    const body = { ...bodies.earth, id: 'custom', name: 'Skerry', yearDays: null };
    expect(textOf(orbit(51.6, { body }))).toMatch(/periapsis .* Local time needs the year and the spin of Skerry\.$/);
  });
});

describe('the sentence below it', () => {
  it('says by how much perigee is off where e is small but not tiny', () => {
    const { mean } = orbit(51.6);
    expect(firstOrderSentence(orbit(51.6, { mean: { ...mean, eccentricity: 0.01 } }), 'degPerDay')).toMatch(
      /At e\u00a00\.0100 the perigee rate is off by up to 12 %\.$/,
    );
  });

  it('says what first order alone would say, and that a round orbit’s perigee means little', () => {
    expect(firstOrderSentence(orbit(97.66), 'degPerDay')).toMatch(
      /^First order alone: node \+0\.98\d\d° a day, perigee \u22123\.\d{4}°, local time .*\. At e\u00a00\.0010 the perigee rate means little\.$/,
    );
  });
});
