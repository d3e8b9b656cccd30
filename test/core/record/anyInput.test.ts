import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  bodyIds,
  type Candidate,
  entryForms,
  fieldIds,
  gravitySetIds,
  inputFrames,
  nodeForms,
} from '../../../core/record/candidate';
import { entryFromOrbit } from '../../../core/record/entryFromOrbit';
import { fingerprint } from '../../../core/record/fingerprint';
import { headlineOf } from '../../../core/record/headline';
import { absentReadings, readingsOf } from '../../../core/record/readings/readings';
import { resolveOrbit } from '../../../core/record/resolveOrbit';
import { warningsOf } from '../../../core/record/warnings';
import { workingOf } from '../../../core/record/workings/workingOf';
import { candidateWith } from './candidates';

/** What people and pastes put into fields: numbers of every size, near numbers, and rubbish. */
const text = fc.oneof(
  { weight: 6, arbitrary: fc.double({ min: -400, max: 9000, noNaN: true }).map(String) },
  { weight: 2, arbitrary: fc.double().map(String) },
  {
    weight: 2,
    arbitrary: fc.constantFrom(
      '0',
      '1',
      '-1',
      '180',
      '0.5',
      '0.999999999',
      '1e12',
      '-1e12',
      '1e-300',
      '10:30',
      '',
      '1,234',
    ),
  },
  { weight: 1, arbitrary: fc.string() },
);
const within = (min: number, max: number) => fc.double({ min, max, noNaN: true }).map(String);
/** Mostly sound fields, over which a few of the others are laid. */
const sound = fc.record({
  epoch: fc.constantFrom('', '2027-03-20T10:30:00Z'),
  perigeeAltitude: within(-2000, 900),
  apogeeAltitude: within(900, 60_000),
  semiMajorAxis: within(300, 60_000),
  eccentricity: fc.oneof(within(0, 1), fc.constantFrom('0', '1e-9', '0.9999999')),
  inclination: fc.oneof(within(0, 180), fc.constantFrom('0', '90', '180')),
  node: fc.oneof(within(-400, 400), fc.constantFrom('10:30', '22.5')),
  perigee: within(-400, 400),
  meanAnomaly: within(-400, 400),
  x: within(-9000, 9000),
  y: within(-9000, 9000),
  z: within(-9000, 9000),
  vx: within(-7, 7),
  vy: within(-7, 7),
  vz: within(-7, 7),
  bodyMu: within(100, 1e6),
  bodyRadius: within(100, 9000),
  bodyJ2: within(-0.01, 0.05),
});
const laidOver = fc.dictionary(fc.constantFrom(...fieldIds), text, { maxKeys: 2 });
const candidates: fc.Arbitrary<Candidate> = fc
  .record({
    sound,
    laidOver,
    body: fc.constantFrom('earth', 'earth', 'earth', 'earth', 'earth', 'earth', ...bodyIds),
    gravitySet: fc.constantFrom(...gravitySetIds),
    form: fc.constantFrom('altitudes', 'elements', 'altitudes', 'elements', ...entryForms),
    elementsAre: fc.constantFrom('mean', 'osculating'),
    nodeForm: fc.constantFrom('raan', 'raan', 'raan', ...nodeForms),
    sun: fc.constantFrom('mean', 'apparent'),
    frame: fc.constantFrom('meanOfDate', 'meanOfDate', 'meanOfDate', ...inputFrames),
    lengthUnit: fc.constantFrom('km', 'NM'),
    stateUnit: fc.constantFrom('km', 'm'),
  })
  .map(({ sound: texts, laidOver: others, ...change }) => candidateWith({ ...texts, ...others }, change));

describe('whatever is typed', () => {
  it('either there is an orbit with numbers, or a message at a field of the form', () => {
    let orbits = 0;
    fc.assert(
      fc.property(candidates, (candidate) => {
        const result = resolveOrbit(candidate);
        if (!result.ok) {
          expect(Object.keys(result.errors).length).toBeGreaterThan(0);
          for (const error of Object.values(result.errors)) expect(error.message).toMatch(/\S/);
          return;
        }
        orbits += 1;
        const { orbit } = result;
        for (const value of [orbit.mean.semiMajorAxisKm, orbit.mean.eccentricity, orbit.mean.inclinationRad]) {
          expect(Number.isFinite(value)).toBe(true);
        }
        const readings = readingsOf(orbit);
        for (const reading of readings) {
          expect(Number.isNaN(reading.value), reading.id).toBe(false);
          reading.sensitivities();
          workingOf(orbit, reading.id);
        }
        absentReadings(orbit);
        warningsOf(orbit, readings);
        headlineOf(orbit, readings);
        expect(fingerprint(orbit)).toMatch(/^[A-Z]{3} [A-Z]{4}$/);
        for (const form of entryForms) entryFromOrbit(orbit, form, candidate.entry);
      }),
      { numRuns: 1000 },
    );
    expect(orbits).toBeGreaterThan(50);
  }, 30_000);
});
