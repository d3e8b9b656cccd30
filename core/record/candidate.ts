/**
 * The candidate: everything a user typed about one orbit, as typed.
 *
 * Only inputs are kept, never results, so that a record opened in five years is computed anew.
 * Fields hold the text itself: "561.0" stays "561.0", and a half-typed or wrong value survives
 * a crash as it stands. `resolveOrbit` reads the text and says what is wrong, field by field.
 */

/** The version that this code writes; older ones are brought here by `migrateCandidate`. */
export const candidateSchema = 1;

export const gravitySetIds = ['EGM2008', 'EGM96', 'WGS84', 'WGS72'] as const;
export type GravitySetId = (typeof gravitySetIds)[number];

export const bodyIds = ['earth', 'moon', 'mars', 'venus', 'mercury', 'jupiter', 'saturn', 'custom'] as const;
export type BodyId = (typeof bodyIds)[number];

/** How the orbit is entered. */
export const entryForms = ['altitudes', 'elements', 'state', 'twoLine'] as const;
export type EntryForm = (typeof entryForms)[number];

/** How the node is entered: right ascension, or local time of the ascending or descending node. */
export const nodeForms = ['raan', 'ltan', 'ltdn'] as const;
export type NodeForm = (typeof nodeForms)[number];

/** Frames an input may be tagged with; `earthFixed` serves state vectors only. */
export const inputFrames = ['meanOfDate', 'j2000', 'teme', 'earthFixed'] as const;
export type InputFrame = (typeof inputFrames)[number];

/** Every text field of an entry. Units are fixed by the field's name and the entry's unit tags. */
export const fieldIds = [
  'epoch',
  // shape
  'perigeeAltitude',
  'apogeeAltitude',
  'semiMajorAxis',
  'eccentricity',
  // orientation and place, degrees (node: degrees, or hh:mm[:ss] for a local time)
  'inclination',
  'node',
  'perigee',
  'meanAnomaly',
  // state vector, in km and km/s or m and m/s
  'x',
  'y',
  'z',
  'vx',
  'vy',
  'vz',
  // two-line elements, both lines (a name line may stand above)
  'twoLine',
  // a body of the user's own
  'bodyName',
  'bodyMu',
  'bodyRadius',
  'bodyJ2',
  'bodyJ3',
  'bodyJ4',
  'bodyFlattening',
  'bodyDay',
  'bodyYear',
] as const;
export type FieldId = (typeof fieldIds)[number];

export interface OrbitEntry {
  readonly form: EntryForm;
  /** For the forms `altitudes` and `elements`. */
  readonly elementsAre: 'mean' | 'osculating';
  readonly nodeForm: NodeForm;
  /** Which Sun a local time refers to. */
  readonly sun: 'mean' | 'apparent';
  readonly frame: InputFrame;
  /** Unit of the altitudes and the semi-major axis as typed. */
  readonly lengthUnit: 'km' | 'NM';
  /** Unit of the state vector as typed: km and km/s, or m and m/s. */
  readonly stateUnit: 'km' | 'm';
  readonly texts: Readonly<Record<FieldId, string>>;
}

export interface Candidate {
  readonly schema: typeof candidateSchema;
  readonly id: string;
  readonly name: string;
  readonly notes: string;
  readonly body: BodyId;
  /** Gravity set of the Earth; other bodies have one set each. */
  readonly gravitySet: GravitySetId;
  readonly entry: OrbitEntry;
  /** Room for what later places add; kept as it is by code that does not know it. */
  readonly conditions: readonly Readonly<Record<string, unknown>>[];
  readonly limits: readonly Readonly<Record<string, unknown>>[];
  readonly plans: Readonly<Record<string, unknown>>;
}
