/**
 * Switching the form, unit or body of an entry without losing the orbit: where the entry is good, the orbit is
 * written into the fields of the new form; where it is not, every text stays as typed.
 */
import { batch } from '@preact/signals';
import {
  type BodyId,
  type Candidate,
  type ConditionEntry,
  type EntryForm,
  entryFromOrbit,
  type InputFrame,
  type KeplerianElements,
  kmPerLengthUnit,
  type NodeForm,
  type OrbitEntry,
  parseTle,
  readNumber,
  type StateTextResult,
  twoLineSetIn,
} from '../../core/index';
import type { OrbitDocument } from './document';
import { fetched } from './fetched';

type Tags = Partial<Omit<OrbitEntry, 'texts'>>;

/** What conditions have settled, else what was typed. */
function orbitAtHand({ resolution, entered }: OrbitDocument) {
  return resolution.value.ok ? resolution.value : entered.value;
}

/** Sets tags and rewrites the fields so that the orbit stays the same; answers why the texts could not follow. */
function retag(document: OrbitDocument, tags: Tags): string | null {
  const { entry } = document.draft.value;
  const { form, ...rest } = { ...entry, ...tags };
  const resolution = orbitAtHand(document);
  const written = resolution.ok ? entryFromOrbit(resolution.orbit, form, rest) : null;
  if (written?.ok) {
    document.setTags(tags, written.texts);
    return null;
  }
  document.setTags(tags);
  return written && written.reason !== 'cannotWrite' ? written.message : null;
}

export function switchForm(document: OrbitDocument, form: EntryForm): void {
  const { entry } = document.draft.value;
  if (form === entry.form) return;
  batch(() => {
    // Elements know no Earth-fixed axes; the numbers are rewritten in axes of date.
    const isRewritten = entry.form === 'twoLine' && orbitAtHand(document).ok;
    const frame = entry.frame === 'earthFixed' || isRewritten ? 'meanOfDate' : entry.frame;
    retag(document, { form, frame });
  });
}

/** A set that can be read brings the gravity set it was made with; a visit to the form changes nothing. */
export function typeTwoLine(document: OrbitDocument, text: string): void {
  batch(() => {
    document.setText('twoLine', text);
    const { body, gravitySet } = document.draft.value;
    if (body === 'earth' && gravitySet !== 'WGS72' && parseTle(text).ok) document.setCandidate({ gravitySet: 'WGS72' });
  });
}

export function switchNodeForm(document: OrbitDocument, nodeForm: NodeForm): void {
  retag(document, { nodeForm });
}

/** The lengths typed, those of conditions too, are rewritten one by one, whether or not the rest of the entry is good. */
export function switchLengthUnit(document: OrbitDocument, lengthUnit: OrbitEntry['lengthUnit']): void {
  const { entry, conditions } = document.draft.value;
  if (entry.lengthUnit === lengthUnit) return;
  const factor = kmPerLengthUnit(entry) / kmPerLengthUnit({ lengthUnit });
  const rewritten = (text: string): string => {
    const number = readNumber(text);
    return number.ok ? String(Number((number.value * factor).toFixed(6))) : text;
  };
  const { perigeeAltitude, apogeeAltitude, semiMajorAxis } = entry.texts;
  const lengths = Object.entries({ perigeeAltitude, apogeeAltitude, semiMajorAxis });
  batch(() => {
    document.setTags({ lengthUnit }, Object.fromEntries(lengths.map(([field, text]) => [field, rewritten(text)])));
    for (const [place, stored] of conditions.entries()) {
      if (!isAltitude(stored)) continue;
      const texts = { ...stored.texts, altitude: rewritten(stored.texts.altitude) };
      document.conditions.change(place, { ...stored, texts });
    }
  });
}

type AltitudeCondition = ConditionEntry & { readonly texts: { readonly altitude: string } };

/** Looked at by hand, since the words of the conditions are fetched only where some are shown. */
function isAltitude(
  stored: Candidate['conditions'][number],
): stored is Candidate['conditions'][number] & AltitudeCondition {
  const texts = stored['texts'] as ConditionEntry['texts'] | null | undefined;
  const isLength = stored['kind'] === 'perigeeAltitude' || stored['kind'] === 'apogeeAltitude';
  return isLength && typeof texts?.altitude === 'string';
}

/** Local times and the frames of the Earth do not exist elsewhere: the node goes back to an angle of date. */
export function switchBody(document: OrbitDocument, body: BodyId): void {
  batch(() => {
    if (body !== 'earth') retag(document, { nodeForm: 'raan', frame: 'meanOfDate' });
    document.setCandidate({ body });
  });
}

const longestPaste = 20_000;

export const stateReader = fetched(async () => (await import('./stateReader')).readState);

export type PasteOutcome = 'notOurs' | { readonly said: string };

/**
 * Takes a paste that is a whole orbit, wherever it was pasted: two-line elements or six numbers of a state.
 * Answers `notOurs` for anything else, which the field then takes as usual.
 */
export function takePaste(document: OrbitDocument, text: string): PasteOutcome {
  if (text.length > longestPaste) {
    const size = text.length > 1e6 ? `${(text.length / 1e6).toFixed(1)} MB` : `${Math.round(text.length / 1e3)} kB`;
    return {
      said: `That paste is ${size}; an orbit is six numbers or two lines of 69 characters. Nothing was changed.`,
    };
  }
  const set = twoLineSetIn(text);
  if (set !== null) {
    batch(() => {
      switchForm(document, 'twoLine');
      typeTwoLine(document, set);
    });
    return { said: 'Read as two-line elements.' };
  }
  if (numberCount(text) < 6) return 'notOurs';
  const state = stateReader.now()?.(text);
  if (state?.ok) return takeState(document, state);
  // A field of one number has no use for a mail; the lines of a set have a field that says what is wrong with them.
  if (text.length <= 30 || document.draft.value.entry.form === 'twoLine') return 'notOurs';
  const why =
    state?.message ?? 'What reads a paste has not been loaded yet: paste it once more, or load Driftbook again.';
  return { said: `${why} Nothing was changed.` };
}

const datePattern = /\d{1,4}[-/.]\d{1,2}[-/.]\d{1,4}(?:[T ][\d:.,+Z-]+)?/g;

/** Dates apart, which the field of the epoch takes. */
function numberCount(text: string): number {
  return text.replace(datePattern, ' ').match(/\d+(?:[.,]\d+)?/g)?.length ?? 0;
}

const frameNames: Readonly<Record<InputFrame, string>> = {
  meanOfDate: 'mean equator and equinox of date',
  j2000: 'J2000',
  teme: 'TEME',
  earthFixed: 'Earth-fixed axes',
};

function takeState(document: OrbitDocument, state: Extract<StateTextResult, { ok: true }>): PasteOutcome {
  const [x = '', y = '', z = '', vx = '', vy = '', vz = ''] = state.numbers;
  const { entry } = document.draft.value;
  const stateUnit = state.unitGuess ?? entry.stateUnit;
  const frame = state.frameGuess ?? entry.frame;
  const epoch = state.epochText === undefined ? {} : { epoch: state.epochText };
  document.setTags({ form: 'state', stateUnit, frame }, { x, y, z, vx, vy, vz, ...epoch });
  const read = `Read as a state vector in ${stateUnit === 'm' ? 'm and m/s' : 'km and km/s'}`;
  const axes = state.frameGuess === undefined ? 'Axes not named: check them' : `Axes: ${frameNames[frame]}. Check them`;
  return { said: `${read}. ${axes}, the unit and the epoch.` };
}

/**
 * Writes some mean elements into the entry, the others staying as they are: a point taken on a chart, a track from the
 * list. A state vector or two-line set cannot hold them, so the entry goes over to altitudes. False where there is no orbit yet.
 */
export function takeElements(document: OrbitDocument, elements: Partial<KeplerianElements>): boolean {
  const resolution = orbitAtHand(document);
  if (!resolution.ok) return false;
  const { form, texts: _, ...tags } = document.draft.value.entry;
  const typed = form === 'state' || form === 'twoLine' ? 'altitudes' : form;
  const frame = tags.frame === 'earthFixed' ? 'meanOfDate' : tags.frame;
  const orbit = { ...resolution.orbit, mean: { ...resolution.orbit.mean, ...elements } };
  const written = entryFromOrbit(orbit, typed, { ...tags, frame });
  if (!written.ok) return false;
  document.setTags({ form: typed, frame }, written.texts);
  return true;
}
