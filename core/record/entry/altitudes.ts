import type { Body } from '../../bodies/body';
import { apsidesAt } from '../bodyWords';
import type { OrbitEntry } from '../candidate';
import type { FieldReader } from '../readFields';
import { plainNumber } from './plainNumber';
import { kmPerLengthUnit, largestRadiusKm, type Shape } from './shape';

/** Semi-major axis and eccentricity from perigee and apogee altitude above the equatorial radius. */
export function readAltitudes(entry: OrbitEntry, body: Body | null, reader: FieldReader): Shape | null {
  const unit = entry.lengthUnit;
  const example = unit === 'km' ? '550' : '297';
  const expected = `the altitude above the equatorial radius in ${unit}, such as ${example}`;
  const perigee = reader.number({
    field: 'perigeeAltitude',
    label: apsidesAt('Perigee altitude', body),
    expected,
    unit,
  });
  const apogee = reader.number({ field: 'apogeeAltitude', label: apsidesAt('Apogee altitude', body), expected, unit });
  if (perigee !== null && apogee !== null && apogee < perigee) {
    const message = `Apogee altitude ${plainNumber(apogee)} ${unit} is below the perigee altitude ${plainNumber(perigee)} ${unit}; type the larger one as apogee.`;
    return reader.fail('apogeeAltitude', apsidesAt(message, body));
  }
  if (perigee === null || apogee === null || body === null) return null;
  const perigeeRadiusKm = body.equatorialRadiusKm + perigee * kmPerLengthUnit(entry);
  const apogeeRadiusKm = body.equatorialRadiusKm + apogee * kmPerLengthUnit(entry);
  if (!(perigeeRadiusKm > 0)) {
    const message = `Perigee altitude ${plainNumber(perigee)} ${unit} lies beyond the centre of the body; expected ${expected}.`;
    return reader.fail('perigeeAltitude', apsidesAt(message, body));
  }
  const semiMajorAxisKm = (perigeeRadiusKm + apogeeRadiusKm) / 2;
  const eccentricity = (apogeeRadiusKm - perigeeRadiusKm) / (perigeeRadiusKm + apogeeRadiusKm);
  if (apogeeRadiusKm > largestRadiusKm || !(eccentricity < 1)) {
    return reader.fail(
      'apogeeAltitude',
      apsidesAt(
        `Apogee altitude ${plainNumber(apogee)} ${unit} is too high for a closed orbit; expected ${expected}.`,
        body,
      ),
    );
  }
  return { semiMajorAxisKm, eccentricity };
}
