/** How the book names what a candidate holds. */
import type { BodyId, Candidate, EntryForm, FieldId, InputFrame, NodeForm } from '../../core/index';

export const formLabels: Readonly<Record<EntryForm, string>> = {
  altitudes: 'altitudes',
  elements: 'a and e',
  state: 'state vector',
  twoLine: 'two-line elements',
};

export const nodeLabels: Readonly<Record<NodeForm, string>> = {
  raan: 'right ascension of the node',
  ltan: 'local time of the ascending node',
  ltdn: 'local time of the descending node',
};

export const frameLabels: Readonly<Record<InputFrame, string>> = {
  meanOfDate: 'mean of date',
  j2000: 'J2000',
  teme: 'TEME',
  earthFixed: 'Earth-fixed',
};

export const bodyLabels: Readonly<Record<BodyId, string>> = {
  earth: 'Earth',
  moon: 'Moon',
  mars: 'Mars',
  venus: 'Venus',
  mercury: 'Mercury',
  jupiter: 'Jupiter',
  saturn: 'Saturn',
  custom: 'a body of your own',
};

export const fieldLabels: Readonly<Record<FieldId, string>> = {
  epoch: 'Epoch',
  perigeeAltitude: 'Perigee altitude',
  apogeeAltitude: 'Apogee altitude',
  semiMajorAxis: 'Semi-major axis',
  eccentricity: 'Eccentricity',
  inclination: 'Inclination',
  node: 'Node',
  perigee: 'Argument of perigee',
  meanAnomaly: 'Mean anomaly',
  x: 'Position x',
  y: 'Position y',
  z: 'Position z',
  vx: 'Velocity x',
  vy: 'Velocity y',
  vz: 'Velocity z',
  twoLine: 'Two-line elements',
  bodyName: 'Name of the body',
  bodyMu: 'GM of the body',
  bodyRadius: 'Radius of the body',
  bodyJ2: 'J2 of the body',
  bodyJ3: 'J3 of the body',
  bodyJ4: 'J4 of the body',
  bodyFlattening: 'Flattening of the body',
  bodyDay: 'Day of the body',
  bodyYear: 'Year of the body',
};

const orientation: readonly FieldId[] = ['inclination', 'node', 'perigee', 'meanAnomaly'];
const fieldsOfForm: Readonly<Record<EntryForm, readonly FieldId[]>> = {
  altitudes: ['epoch', 'perigeeAltitude', 'apogeeAltitude', ...orientation],
  elements: ['epoch', 'semiMajorAxis', 'eccentricity', ...orientation],
  state: ['epoch', 'x', 'y', 'z', 'vx', 'vy', 'vz'],
  twoLine: ['twoLine'],
};
const bodyFields: readonly FieldId[] = [
  'bodyName',
  'bodyMu',
  'bodyRadius',
  'bodyJ2',
  'bodyJ3',
  'bodyJ4',
  'bodyFlattening',
  'bodyDay',
  'bodyYear',
];

/** The fields that say what the orbit is; the rest is kept for when the form is changed back. */
export function fieldsInUse({ body, entry }: Candidate): readonly FieldId[] {
  return body === 'custom' ? [...bodyFields, ...fieldsOfForm[entry.form]] : fieldsOfForm[entry.form];
}

/** Such as `state vector in m, Earth-fixed`. */
export function enteredAs({ body, gravitySet, entry }: Candidate): string {
  const details = {
    altitudes: `, ${entry.elementsAre} elements`,
    elements: `, ${entry.elementsAre} elements`,
    state: ` in ${entry.stateUnit}, ${frameLabels[entry.frame]}`,
    twoLine: '',
  } as const;
  const bodyText = body === 'earth' ? gravitySet : bodyLabels[body];
  return `${formLabels[entry.form]}${details[entry.form]}; ${bodyText}`;
}
