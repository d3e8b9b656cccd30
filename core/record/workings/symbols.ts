/**
 * Every symbol of the workings: glyph, name and the unit its value is shown in. Angles in degrees that stand outside a
 * cosine or sine are values in degrees, so that a calculator given the numbers shown follows.
 */
export interface WorkingSymbol {
  readonly id: string;
  readonly glyph: string;
  /** Subscript of the glyph. */
  readonly sub?: string;
  readonly name: string;
  /** Unit shown; a value times `perCore` is the number in it. Core units are km, s, rad. */
  readonly unit: string;
  readonly perCore: number;
}

const deg = 180 / Math.PI;

/** glyph (and its subscript behind a `_`), name, unit, and the factor from core units where it is not 1. */
type Row = readonly [glyph: string, name: string, unit: string, perCore?: number];

const rows = {
  // the orbit
  a: ['a', 'semi-major axis', 'km'],
  e: ['e', 'eccentricity', ''],
  i: ['i', 'inclination', 'deg', deg],
  node: ['Ω', 'node, right ascension', 'deg'],
  perigee: ['ω', 'argument of perigee', 'deg', deg],
  // the body
  mu: ['μ', 'gravitational parameter', 'km³/s²'],
  R: ['R', 'reference radius of the gravity set', 'km'],
  Req: ['Rₑ', 'equatorial radius, datum of altitudes', 'km'],
  J2: ['J₂', 'oblateness', ''],
  J4: ['J₄', 'zonal of degree 4', ''],
  bodyRate: ['ω_b', 'rotation of the body', 'rad/s'],
  year: ['Y', 'tropical year', 's'],
  day: ['d', 'day', 's'],
  sunAngle: ['α', 'right ascension of the Sun at the epoch', 'deg'],
  // on the way
  n: ['n', 'mean motion', 'rad/s'],
  p: ['p', 'semi-latus rectum', 'km'],
  eta: ['η', 'root of 1 − e²', ''],
  theta: ['θ', 'cosine of the inclination', ''],
  k: ['k', 'J2 rate', 'rad/s'],
  gamma2: ['γ₂', 'J2 parameter', ''],
  gamma4: ['γ₄', 'J4 parameter', ''],
  nodeJ2: ['A', 'node, J2 term', ''],
  nodeJ2Squared: ['B', 'node, J2² term', ''],
  nodeJ4: ['C', 'node, J4 term', ''],
  perigeeJ2: ['D', 'perigee, J2 term', ''],
  perigeeJ2Squared: ['E', 'perigee, J2² term', ''],
  perigeeJ4: ['F', 'perigee, J4 term', ''],
  anomalyJ2: ['G', 'mean anomaly, J2 term', ''],
  anomalyJ2Squared: ['H', 'mean anomaly, J2² term', ''],
  anomalyJ4: ['K', 'mean anomaly, J4 term', ''],
  sunRate: ['n☉', 'rate of the mean Sun', 'rad/s'],
  // results
  nodeRate: ['Ω̇', 'node rate', 'rad/s'],
  perigeeRate: ['ω̇', 'perigee rate', 'rad/s'],
  anomalyRate: ['Ṁ', 'rate of mean anomaly', 'rad/s'],
  keplerian: ['T', 'Keplerian period', 's'],
  anomalistic: ['Tₐ', 'anomalistic period', 's'],
  nodal: ['Tₙ', 'nodal period', 's'],
  nodalDay: ['Dₙ', 'nodal day', 's'],
  revolutions: ['N', 'revolutions a day', 'rev/day'],
  drift: ['τ̇', 'drift of local time', 's/s'],
  shift: ['Δλ', 'westward shift a revolution', 'rad'],
  apsidal: ['T_ω', 'apsidal period', 's'],
  perigeeAltitude: ['hₚ', 'perigee altitude', 'km'],
  apogeeAltitude: ['hₐ', 'apogee altitude', 'km'],
  speed: ['vₚ', 'speed at perigee', 'km/s'],
  eCos: ['k', 'e cos ω', ''],
  eSin: ['h', 'e sin ω', ''],
  localTime: ['t', 'local time of the node', 'h'],
  // the result once more, in people's units
  nodePerDay: ['ΔΩ', 'node drift in a day', 'deg/day'],
  perigeePerDay: ['Δω', 'perigee drift in a day', 'deg/day'],
  minutes: ['T_min', 'the period', 'min'],
  driftPerYear: ['Δτ', 'drift of local time in a year', 'min/yr'],
  shiftDegrees: ['Δλ_°', 'westward shift a revolution', 'deg'],
  shiftKm: ['s', 'shift at the equator', 'km'],
  apsidalDays: ['T_ω, d', 'apsidal period', 'd'],
} as const satisfies Readonly<Record<string, Row>>;

export type SymbolId = keyof typeof rows;

export function workingSymbol(id: SymbolId): WorkingSymbol {
  const [written, name, unit, perCore]: Row = rows[id];
  const [glyph = '', sub] = written.split('_');
  return { id, glyph, ...(sub === undefined ? {} : { sub }), name, unit, perCore: perCore ?? 1 };
}
