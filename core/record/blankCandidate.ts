import { type Candidate, candidateSchema, type FieldId, fieldIds } from './candidate';

/** What a new entry starts from: a round low orbit near the Sun-synchronous inclination, no epoch yet. */
const startingTexts: Partial<Record<FieldId, string>> = {
  perigeeAltitude: '550',
  apogeeAltitude: '550',
  inclination: '97.6',
  node: '0',
  perigee: '0',
  meanAnomaly: '0',
};

/** Every field empty but those given. */
export function fieldTexts(given: Partial<Record<FieldId, string>>): Record<FieldId, string> {
  return Object.fromEntries(fieldIds.map((id) => [id, given[id] ?? ''])) as Record<FieldId, string>;
}

/** A candidate to start from; its identity comes from outside, since core makes no random numbers. */
export function blankCandidate({ id, name = '' }: { readonly id: string; readonly name?: string }): Candidate {
  return {
    schema: candidateSchema,
    id,
    name,
    notes: '',
    body: 'earth',
    gravitySet: 'EGM2008',
    entry: {
      form: 'altitudes',
      elementsAre: 'mean',
      nodeForm: 'raan',
      sun: 'mean',
      frame: 'meanOfDate',
      lengthUnit: 'km',
      stateUnit: 'km',
      texts: fieldTexts(startingTexts),
    },
    conditions: [],
    limits: [],
    plans: {},
  };
}
