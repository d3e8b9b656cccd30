import { bodies } from '../../bodies/bodies';
import type { Body } from '../../bodies/body';
import { customBody } from '../../bodies/customBody';
import { gravitySets } from '../../bodies/earth';
import { twoPi } from '../../numerics/angles';
import type { Candidate, FieldId } from '../candidate';
import type { FieldReader } from '../readFields';
import { plainNumber } from './plainNumber';

/** The body the orbit goes around: one that comes with Driftbook, or the user's own from its texts. */
export function readBody(candidate: Candidate, reader: FieldReader): Body | null {
  if (candidate.body === 'earth') return gravitySets[candidate.gravitySet];
  if (candidate.body !== 'custom') return bodies[candidate.body];
  const muKm3PerS2 = positive(reader, 'bodyMu', 'Gravity parameter μ', 'km³/s², such as 398600.4415');
  const radiusKm = positive(reader, 'bodyRadius', 'Equatorial radius', 'km, such as 6378.1363');
  const j2 = zonal(reader, 'bodyJ2', 2, reader.number);
  const j3 = zonal(reader, 'bodyJ3', 3, reader.optionalNumber);
  const j4 = zonal(reader, 'bodyJ4', 4, reader.optionalNumber);
  const flattening = readFlattening(reader);
  const rotationRadPerS = readRotation(reader);
  const yearDays = readYear(reader);
  if (muKm3PerS2 === null || radiusKm === null || j2 === null || j2 === undefined || j3 === null || j4 === null) {
    return null;
  }
  if (flattening === null || rotationRadPerS === null || yearDays === null) return null;
  return customBody({
    name: reader.text('bodyName') || 'Own body',
    muKm3PerS2,
    radiusKm,
    zonals: zonalsTyped(j2, j3, j4),
    flattening,
    rotationRadPerS,
    yearDays,
  });
}

/** What is left blank is absent, not zero: nothing that turns on it may be answered from a guess. */
function zonalsTyped(j2: number, j3: number | undefined, j4: number | undefined): readonly number[] {
  const zonals = [0, 0, j2];
  if (j3 !== undefined) zonals[3] = j3;
  if (j4 !== undefined) zonals[4] = j4;
  return zonals;
}

function positive(reader: FieldReader, field: FieldId, label: string, unitAndExample: string): number | null {
  const unit = unitAndExample.split(',')[0];
  const value = reader.number({ field, label, unit, expected: `a number above 0, in ${unitAndExample}` });
  if (value === null || value > 0) return value;
  return reader.fail(field, `${label} is ${plainNumber(value)}; expected a number above 0, in ${unitAndExample}.`);
}

type Read = FieldReader['optionalNumber'];

function zonal(reader: FieldReader, field: FieldId, degree: number, read: Read): number | null | undefined {
  const label = `J${degree}`;
  const expected = 'the unnormalised coefficient, such as 0.00108';
  const value = read({ field, label, expected });
  if (value === null || value === undefined || Math.abs(value) < 0.5) return value;
  return reader.fail(field, `${label} is ${plainNumber(value)}; expected ${expected}, between −0.5 and 0.5.`);
}

function readFlattening(reader: FieldReader): number | null | undefined {
  const expected = 'a number from 0 to less than 1, such as 0.00335';
  const value = reader.optionalNumber({ field: 'bodyFlattening', label: 'Flattening', expected });
  if (value === null || value === undefined || (value >= 0 && value < 1)) return value;
  return reader.fail('bodyFlattening', `Flattening is ${plainNumber(value)}; expected ${expected}.`);
}

/** A sidereal day in hours, negative on a retrograde rotator, becomes a rate. */
function readRotation(reader: FieldReader): number | null | undefined {
  const expected = 'the sidereal day in hours, such as 23.9345, negative where the body turns backwards';
  const hours = reader.optionalNumber({ field: 'bodyDay', label: 'Sidereal day', unit: 'h', expected });
  if (hours === null || hours === undefined) return hours;
  if (Math.abs(hours) < 0.01)
    return reader.fail('bodyDay', `Sidereal day is ${plainNumber(hours)} h; expected ${expected}.`);
  return twoPi / (hours * 3600);
}

function readYear(reader: FieldReader): number | null | undefined {
  const expected = 'the year in days of 86 400 s, above 0, such as 365.2422';
  const days = reader.optionalNumber({ field: 'bodyYear', label: 'Year', unit: 'd', expected });
  if (days === null || days === undefined || days > 0) return days;
  return reader.fail('bodyYear', `Year is ${plainNumber(days)}; expected ${expected}.`);
}
