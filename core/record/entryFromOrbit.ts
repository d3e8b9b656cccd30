/**
 * The inverse of reading: writes an orbit into the texts of a form, for a switch of form, unit,
 * frame or node. As few digits as keep lengths to 0.1 m, e to 1e-9, angles to 1e-6°, the node to 7.5e-6° or 1.5 ms,
 * a state to mm and µm/s, and all of them on their step of the fingerprint: the noise of a conversion is not written.
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
import { onSameStep } from './fingerprint';
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
    stateFieldIds.map((field, index) => [field, trimmed((numbers[index] ?? 0) * factor, (index < 3 ? 6 : 9) - shift)]),
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
  const [perigee, apogee] = [perigeeAltitudeKm(body, elements), apogeeAltitudeKm(body, elements)];
  const written = (toleranceKm: number) =>
    [perigee, apogee].map((km) => shortest(km / perUnit, { tolerance: toleranceKm / perUnit }));
  const keeps = ([low = '', high = '']: readonly string[]) => {
    const change = [Number(low) * perUnit - perigee, Number(high) * perUnit - apogee] as const;
    const semiMajorAxisKm = elements.semiMajorAxisKm + (change[0] + change[1]) / 2;
    const axisTimesE = elements.semiMajorAxisKm * elements.eccentricity + (change[1] - change[0]) / 2;
    return (
      onSameStep(semiMajorAxisKm, elements.semiMajorAxisKm, 1e-3) &&
      onSameStep(axisTimesE / semiMajorAxisKm, elements.eccentricity, 1e-6)
    );
  };
  const short = written(1e-4);
  const [perigeeAltitude = '', apogeeAltitude = ''] = keeps(short) ? short : written(1e-6);
  return { perigeeAltitude, apogeeAltitude };
}

function shapeTexts(elements: KeplerianElements, tags: EntryTags) {
  const perUnit = kmPerLengthUnit(tags);
  const onGrid = { tolerance: 1e-4 / perUnit, step: 1e-3 / perUnit };
  return {
    semiMajorAxis: shortest(elements.semiMajorAxisKm / perUnit, onGrid),
    eccentricity: shortest(elements.eccentricity, { tolerance: 1e-9, step: 1e-6 }),
  };
}

function orientationTexts({ epochJd }: ResolvedOrbit, elements: KeplerianElements, tags: EntryTags) {
  const node = tags.nodeForm === 'ltdn' ? 'descending' : 'ascending';
  const clock = tags.nodeForm !== 'raan' && epochJd !== null;
  return {
    inclination: shortest(elements.inclinationRad * degPerRad, { tolerance: 1e-6, step: angleStep }),
    node: clock
      ? nodeTimeText(elements.nodeRad, localTimeOfNodeH(elements.nodeRad, epochJd, { node, sun: tags.sun }))
      : degreesText(elements.nodeRad, 7.5e-6),
    perigee: degreesText(elements.perigeeRad),
    meanAnomaly: degreesText(elements.meanAnomalyRad),
  };
}

const angleStep = 1e-4;

/** An hour is 15° of the node. */
function nodeTimeText(nodeRad: number, hours: number): string {
  const degrees = nodeRad * degPerRad;
  return localTimeText(hours, (written) => onSameStep(degrees + (written - hours) * 15, degrees, angleStep));
}

function degreesText(rad: number, tolerance = 1e-6): string {
  const text = shortest(wrapTwoPi(rad) * degPerRad, { tolerance, step: angleStep });
  return text === '360' ? '0' : text;
}

/** As few decimals as come within the tolerance and stay on the same step of the fingerprint. */
function shortest(value: number, { tolerance, step }: { tolerance: number; step?: number }): string {
  for (let digits = 0; digits < 12; digits++) {
    const text = trimmed(value, digits);
    const isNear = Math.abs(Number(text) - value) <= tolerance;
    if (isNear && (step === undefined || onSameStep(Number(text), value, step))) return text;
  }
  return trimmed(value, 12);
}

/** Fixed digits without trailing zeros, and never "-0". */
function trimmed(value: number, digits: number): string {
  const text = value.toFixed(digits);
  const short = text.includes('.') ? text.replace(/\.?0+$/, '') : text;
  return short === '-0' ? '0' : short;
}
