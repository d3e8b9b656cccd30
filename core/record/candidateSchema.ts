/**
 * Reads a candidate from data of unknown origin (a file, the store, a paste) and says, field by
 * field, what is wrong with it. Keys inside conditions, limits and plans are kept as they are.
 */
import * as v from 'valibot';
import {
  bodyIds,
  type Candidate,
  candidateSchema,
  entryForms,
  type FieldId,
  fieldIds,
  gravitySetIds,
  inputFrames,
  nodeForms,
} from './candidate';
import { migrateCandidate } from './migrate';
import { plainDataProblem } from './plainData';

/** Longest texts kept, in characters: far above any honest entry, far below what slows a save. */
export const lengthCaps = { id: 100, name: 200, notes: 20_000, text: 20_000, list: 200 } as const;

export interface CandidateError {
  /** Dotted path, such as `entry.texts.inclination`; empty for the whole record. */
  readonly path: string;
  readonly message: string;
}
export type ParsedCandidate =
  | { readonly ok: true; readonly candidate: Candidate }
  | { readonly ok: false; readonly errors: readonly CandidateError[] };

function text(what: string, cap: number) {
  return v.pipe(
    v.string(`Expected ${what} as text.`),
    v.maxLength(cap, `Expected ${what} of at most ${cap} characters.`),
  );
}

function oneOf<const Options extends readonly string[]>(options: Options) {
  return v.picklist(options, `Expected one of: ${options.join(', ')}.`);
}

const room = v.pipe(
  v.record(v.string(), v.unknown(), 'Expected an object.'),
  v.rawCheck(({ dataset, addIssue }) => {
    const problem = dataset.typed ? plainDataProblem(dataset.value) : null;
    if (problem) addIssue({ message: problem });
  }),
);
const roomList = v.pipe(
  v.array(room, 'Expected a list.'),
  v.maxLength(lengthCaps.list, `Expected at most ${lengthCaps.list} entries.`),
);

const typedText = v.optional(text('the field', lengthCaps.text), '');
const textEntries = Object.fromEntries(fieldIds.map((id) => [id, typedText])) as Record<FieldId, typeof typedText>;

const entrySchema = v.object(
  {
    form: oneOf(entryForms),
    elementsAre: oneOf(['mean', 'osculating']),
    nodeForm: oneOf(nodeForms),
    sun: oneOf(['mean', 'apparent']),
    frame: oneOf(inputFrames),
    lengthUnit: oneOf(['km', 'NM']),
    stateUnit: oneOf(['km', 'm']),
    texts: v.object(textEntries, 'Expected the typed texts, one for each field.'),
  },
  'Expected the entry of the orbit.',
);

const schema = v.object(
  {
    schema: v.literal(candidateSchema, `Expected schema ${candidateSchema}.`),
    id: v.pipe(text('an identifier', lengthCaps.id), v.minLength(1, 'Expected an identifier that is not empty.')),
    name: text('a name', lengthCaps.name),
    notes: v.optional(text('notes', lengthCaps.notes), ''),
    body: oneOf(bodyIds),
    gravitySet: oneOf(gravitySetIds),
    entry: entrySchema,
    conditions: v.optional(roomList, []),
    limits: v.optional(roomList, []),
    plans: v.optional(room, {}),
  },
  'Expected a candidate.',
);

/** The candidate, brought to the current schema, or every field that is wrong and what was expected there. */
export function parseCandidate(input: unknown): ParsedCandidate {
  const migration = migrateCandidate(input);
  if (!migration.ok) {
    return {
      ok: false,
      errors: [{ path: migration.reason === 'notARecord' ? '' : 'schema', message: migration.message }],
    };
  }
  const result = v.safeParse(schema, migration.record);
  if (result.success) return { ok: true, candidate: result.output };
  const errors = result.issues.map((issue) => ({ path: v.getDotPath(issue) ?? '', message: wordsOf(issue) }));
  return { ok: false, errors };
}

/** valibot reports an absent key on the object that lacks it, in its own words. */
function wordsOf(issue: v.BaseIssue<unknown>): string {
  if (issue.input === undefined && issue.path) return 'Missing; expected a value here.';
  return issue.message;
}
