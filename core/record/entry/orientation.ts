import type { Body } from '../../bodies/body';
import { radPerDeg, wrapTwoPi } from '../../numerics/angles';
import { nodeFromLocalTimeRad } from '../../orbit/localTime';
import { apsidesAt } from '../bodyWords';
import type { FieldId, OrbitEntry } from '../candidate';
import { type FieldReader, quoted } from '../readFields';
import { readLocalTime } from './localTimeText';
import { plainNumber } from './plainNumber';

export interface Orientation {
  readonly inclinationRad: number;
  readonly nodeRad: number;
  readonly perigeeRad: number;
  readonly meanAnomalyRad: number;
}

/** Inclination, node, perigee and mean anomaly of the forms that type them; null with messages left. */
export function readOrientation(
  entry: OrbitEntry,
  body: Body | null,
  epochJd: number | null | undefined,
  reader: FieldReader,
): Orientation | null {
  const inclinationRad = readInclination(reader);
  const nodeRad =
    entry.nodeForm === 'raan' ? readAngle(reader, 'node', 'Node') : readNodeTime(entry, body, epochJd, reader);
  const perigeeRad = readAngle(reader, 'perigee', apsidesAt('Argument of perigee', body));
  const meanAnomalyRad = readAngle(reader, 'meanAnomaly', 'Mean anomaly');
  if (inclinationRad === null || nodeRad === null || perigeeRad === null || meanAnomalyRad === null) return null;
  return { inclinationRad, nodeRad, perigeeRad, meanAnomalyRad };
}

function readInclination(reader: FieldReader): number | null {
  const expected = 'degrees from 0 to 180';
  const meant = (value: number) => value >= 0 && value <= 180;
  const degrees = reader.number({ field: 'inclination', label: 'Inclination', unit: '°', expected, meant });
  if (degrees === null) return null;
  if (meant(degrees)) return degrees * radPerDeg;
  return reader.fail('inclination', `Inclination is ${plainNumber(degrees)}°; expected ${expected}.`);
}

/** Any real number of degrees; whole turns are taken off. */
function readAngle(reader: FieldReader, field: FieldId, label: string): number | null {
  const meant = (value: number) => Math.abs(value) <= 360;
  const degrees = reader.number({ field, label, unit: '°', expected: 'degrees, such as 247.5', meant });
  return degrees === null ? null : wrapTwoPi((degrees % 360) * radPerDeg);
}

/** The node from its local time at the epoch. */
function readNodeTime(
  entry: OrbitEntry,
  body: Body | null,
  epochJd: number | null | undefined,
  reader: FieldReader,
): number | null {
  const node = entry.nodeForm === 'ltdn' ? 'descending' : 'ascending';
  const label = `Local time of the ${node} node`;
  if (body !== null && body.id !== 'earth') {
    return reader.fail('node', `${label} is worked out for the Earth only; type the node as an angle.`);
  }
  const text = reader.text('node');
  const expected = 'hours and minutes from 00:00 to 23:59, such as 10:30, or decimal hours, such as 10.5';
  if (text === '') return reader.fail('node', `${label} is empty; type ${expected}.`);
  const hours = readLocalTime(text);
  if (hours === null) return reader.fail('node', `${label}: “${quoted(text)}” is not a time of day; type ${expected}.`);
  // Without an epoch the message stands at the epoch.
  return typeof epochJd === 'number' ? nodeFromLocalTimeRad(hours, epochJd, { node, sun: entry.sun }) : null;
}
