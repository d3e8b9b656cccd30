import type { Body } from '../../bodies/body';
import type { OrbitEntry } from '../candidate';
import type { FieldReader } from '../readFields';
import { plainNumber } from './plainNumber';
import { kmPerLengthUnit, largestRadiusKm, type Shape } from './shape';

/** Deeper inside the body than this share of its radius every formula loses its meaning. */
const leastShare = 0.01;

/** Semi-major axis and eccentricity as typed. */
export function readShape(entry: OrbitEntry, body: Body | null, reader: FieldReader): Shape | null {
  const semiMajorAxisKm = readSemiMajorAxis(entry, body, reader);
  const eccentricity = readEccentricity(reader);
  return semiMajorAxisKm === null || eccentricity === null ? null : { semiMajorAxisKm, eccentricity };
}

function readSemiMajorAxis(entry: OrbitEntry, body: Body | null, reader: FieldReader): number | null {
  const unit = entry.lengthUnit;
  const expected = `a length above 0 in ${unit}, from the centre of the body, such as ${unit === 'km' ? '6928' : '3741'}`;
  const typed = reader.number({ field: 'semiMajorAxis', label: 'Semi-major axis', unit, expected });
  if (typed === null) return null;
  const km = typed * kmPerLengthUnit(entry);
  if (km > leastShare * (body?.radiusKm ?? 0) && km <= largestRadiusKm) return km;
  return reader.fail('semiMajorAxis', `Semi-major axis is ${plainNumber(typed)} ${unit}; expected ${expected}.`);
}

function readEccentricity(reader: FieldReader): number | null {
  const expected = 'a number from 0 to less than 1, such as 0.001';
  const meant = (number: number) => number >= 0 && number < 1;
  const value = reader.number({ field: 'eccentricity', label: 'Eccentricity', expected, meant });
  if (value === null || meant(value)) return value;
  const reason = value >= 1 ? 'such an orbit does not close' : 'it cannot be negative';
  return reader.fail('eccentricity', `Eccentricity is ${plainNumber(value)}; ${reason}. Expected ${expected}.`);
}
