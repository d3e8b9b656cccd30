/**
 * The inverse of reading: writes an orbit into the texts of a form, for a switch of form, unit,
 * frame or node. Enough digits are kept for a to 0.1 m, angles to 1e-7° and e to 1e-9.
 */
import { isoFromJulianDate } from '../bodies/julianDate';
import { degPerRad, wrapTwoPi } from '../numerics/angles';
import type { KeplerianElements, StateVector } from '../orbit/elements';
import { elementsFromMeanOfDate, stateFromMeanOfDate } from '../orbit/frames';
import { localTimeOfNodeH } from '../orbit/localTime';
import { stateFromMean } from '../orbit/meanState';
import { elementsFromState } from '../orbit/state';
import type { EntryForm, FieldId, OrbitEntry } from './candidate';
import { localTimeText } from './entry/localTimeText';
import { apogeeAltitudeKm, kmPerLengthUnit, perigeeAltitudeKm } from './entry/shape';
import { stateFieldIds } from './entry/stateVector';
import type { ResolvedOrbit } from './resolved';

/** How the texts are to be understood: the entry's tags without its form and texts. */
export type EntryTags = Omit<OrbitEntry, 'form' | 'texts'>;

export type EntryTexts =
  | { readonly ok: true; readonly texts: Partial<Record<FieldId, string>> }
  | { readonly ok: false; readonly reason: 'needsEpoch' | 'earthOnly' | 'cannotWrite'; readonly message: string };

/** The texts of the fields that the form uses; the other fields are left to the caller. */
export function entryFromOrbit(orbit: ResolvedOrbit, form: EntryForm, tags: EntryTags): EntryTexts {
  const refusal = refusalOf(orbit, form, tags);
  if (refusal) return refusal;
  const epoch: Partial<Record<FieldId, string>> = orbit.epochJd === null ? {} : { epoch: epochText(orbit.epochJd) };
  const state = form === 'state' || tags.elementsAre === 'osculating' ? osculatingState(orbit) : null;
  if (form === 'state') return state ? { ok: true, texts: { ...epoch, ...stateTexts(orbit, state, tags) } } : noState;
  const elements = tags.elementsAre === 'mean' ? orbit.mean : state && osculatingElements(orbit, state);
  if (elements === null) return noState;
  const typed = inTypedFrame(orbit, elements, tags);
  const shape = form === 'altitudes' ? altitudeTexts(orbit, typed, tags) : shapeTexts(typed, tags);
  return { ok: true, texts: { ...epoch, ...shape, ...orientationTexts(orbit, typed, tags) } };
}

function refusalOf(orbit: ResolvedOrbit, form: EntryForm, tags: EntryTags): EntryTexts | null {
  if (form === 'twoLine') {
    return refuse('cannotWrite', 'Two-line elements come from tracking; they are read here, not written.');
  }
  const usesLocalTime = form !== 'state' && tags.nodeForm !== 'raan';
  const usesFrame = form === 'state' ? tags.frame : usesLocalTime ? 'meanOfDate' : tags.frame;
  if (usesFrame === 'earthFixed' && form !== 'state') {
    return refuse('cannotWrite', 'Earth-fixed axes serve state vectors only.');
  }
  if (!usesLocalTime && usesFrame === 'meanOfDate') return null;
  if (orbit.body.id !== 'earth')
    return refuse('earthOnly', 'Local times and these frames are worked out for the Earth only.');
  if (orbit.epochJd === null && usesFrame !== 'teme') {
    return refuse('needsEpoch', 'This needs an epoch; type it first, then switch.');
  }
  return null;
}

function refuse(reason: 'needsEpoch' | 'earthOnly' | 'cannotWrite', message: string): EntryTexts {
  return { ok: false, reason, message };
}

/** As many decimals of a second as the Julian date holds (0.04 ms); none where it is a whole second. */
function epochText(jd: number): string {
  const steps = Math.round(jd * 86_400 * 1e4);
  const fraction = String(steps % 1e4)
    .padStart(4, '0')
    .replace(/0+$/, '');
  const whole = isoFromJulianDate(Math.floor(steps / 1e4) / 86_400);
  return fraction === '' ? whole : whole.replace('Z', `.${fraction}Z`);
}

const noState = refuse('cannotWrite', 'J2 is too large a correction on this orbit for it to have a state.');

/** Null where the short-period terms are so large that no ellipse belongs to the mean elements. */
function osculatingState({ body, mean }: ResolvedOrbit): StateVector | null {
  try {
    return stateFromMean(body, mean);
  } catch {
    return null;
  }
}

function stateTexts(orbit: ResolvedOrbit, ofDate: StateVector, tags: EntryTags): Partial<Record<FieldId, string>> {
  const { frame } = tags;
  const state = orbit.epochJd === null ? ofDate : stateFromMeanOfDate(ofDate, { frame, epochJd: orbit.epochJd });
  const [factor, shift] = tags.stateUnit === 'm' ? [1000, 3] : [1, 0];
  const numbers = [...state.positionKm, ...state.velocityKmPerS];
  return Object.fromEntries(
    stateFieldIds.map((field, index) => [field, trimmed((numbers[index] ?? 0) * factor, (index < 3 ? 7 : 10) - shift)]),
  );
}

function osculatingElements({ body }: ResolvedOrbit, state: StateVector): KeplerianElements | null {
  const result = elementsFromState(body.muKm3PerS2, state);
  return result.ok ? result.elements : null;
}

function inTypedFrame({ epochJd }: ResolvedOrbit, elements: KeplerianElements, tags: EntryTags): KeplerianElements {
  const frame = tags.nodeForm === 'raan' ? tags.frame : 'meanOfDate';
  if (epochJd === null || frame === 'earthFixed') return elements;
  return elementsFromMeanOfDate(elements, frame, epochJd);
}

function altitudeTexts({ body }: ResolvedOrbit, elements: KeplerianElements, tags: EntryTags) {
  const perUnit = kmPerLengthUnit(tags);
  return {
    perigeeAltitude: trimmed(perigeeAltitudeKm(body, elements) / perUnit, 6),
    apogeeAltitude: trimmed(apogeeAltitudeKm(body, elements) / perUnit, 6),
  };
}

function shapeTexts(elements: KeplerianElements, tags: EntryTags) {
  return {
    semiMajorAxis: trimmed(elements.semiMajorAxisKm / kmPerLengthUnit(tags), 5),
    eccentricity: trimmed(elements.eccentricity, 10),
  };
}

function orientationTexts({ epochJd }: ResolvedOrbit, elements: KeplerianElements, tags: EntryTags) {
  const node = tags.nodeForm === 'ltdn' ? 'descending' : 'ascending';
  const clock = tags.nodeForm !== 'raan' && epochJd !== null;
  return {
    inclination: trimmed(elements.inclinationRad * degPerRad, 8),
    node: clock
      ? localTimeText(localTimeOfNodeH(elements.nodeRad, epochJd, { node, sun: tags.sun }))
      : degreesText(elements.nodeRad),
    perigee: degreesText(elements.perigeeRad),
    meanAnomaly: degreesText(elements.meanAnomalyRad),
  };
}

function degreesText(rad: number): string {
  const text = trimmed(wrapTwoPi(rad) * degPerRad, 8);
  return text === '360' ? '0' : text;
}

/** Fixed digits without trailing zeros, and never "-0". */
function trimmed(value: number, digits: number): string {
  const text = value.toFixed(digits);
  const short = text.includes('.') ? text.replace(/\.?0+$/, '') : text;
  return short === '-0' ? '0' : short;
}
