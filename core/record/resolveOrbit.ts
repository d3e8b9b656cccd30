/**
 * From the texts of an entry to one orbit in Brouwer mean elements, mean equator and equinox of the
 * epoch, or to a message at every field of the form in use that is in the way.
 */
import type { Body } from '../bodies/body';
import type { KeplerianElements, MeanElements } from '../orbit/elements';
import { elementsToMeanOfDate } from '../orbit/frames';
import { tryMeanFromOsculating } from '../orbit/meanState';
import { apsidesAt } from './bodyWords';
import type { Candidate, FieldId, OrbitEntry } from './candidate';
import { readAltitudes } from './entry/altitudes';
import { readBody } from './entry/body';
import { readShape } from './entry/elements';
import { type EpochReading, readEpoch } from './entry/epoch';
import { angleFrame, checkFrame, epochNeed, noteFrame } from './entry/frame';
import { readOrientation } from './entry/orientation';
import { perigeeAltitudeKm } from './entry/shape';
import { readState } from './entry/stateVector';
import { readTwoLine } from './entry/twoLine';
import { type FieldReader, fieldReader } from './readFields';
import type { Resolution, ResolvedOrbit } from './resolved';

/** Reads the form in use; fields of the other forms are neither read nor complained about. */
export function resolveOrbit(candidate: Candidate): Resolution {
  const reader = fieldReader(candidate.entry.texts);
  const body = readBody(candidate, reader);
  const orbit =
    candidate.entry.form === 'twoLine' ? fromTwoLine(candidate, body, reader) : fromForm(candidate, body, reader);
  if (orbit === null || Object.keys(reader.errors).length > 0) {
    return { ok: false, errors: reader.errors, notices: reader.notices };
  }
  noteFrame(candidate.entry, reader);
  notePerigee(orbit, reader);
  return { ok: true, orbit, notices: reader.notices };
}

function fromTwoLine(candidate: Candidate, body: Body | null, reader: FieldReader): ResolvedOrbit | null {
  const reading = readTwoLine(candidate, body, reader);
  if (reading === null || body === null) return null;
  return { body, ...reading, theory: 'SGP4', origin: 'twoLine', typedAs: 'mean' };
}

function fromForm(candidate: Candidate, body: Body | null, reader: FieldReader): ResolvedOrbit | null {
  const { entry } = candidate;
  const isEarth = candidate.body === 'earth';
  const frameFits = checkFrame(entry, isEarth, reader);
  const epochJd = readEpoch(reader, isEarth && frameFits ? epochNeed(entry) : null);
  const mean =
    entry.form === 'state' ? readState(entry, body, epochJd, reader) : fromElements(entry, body, epochJd, reader);
  if (mean === null || body === null || epochJd === undefined) return null;
  const typedAs = entry.form === 'state' ? 'osculating' : entry.elementsAre;
  return { body, mean, epochJd, theory: 'Brouwer', origin: entry.form, typedAs };
}

function fromElements(
  entry: OrbitEntry,
  body: Body | null,
  epochJd: EpochReading,
  reader: FieldReader,
): MeanElements | null {
  const shape = entry.form === 'altitudes' ? readAltitudes(entry, body, reader) : readShape(entry, body, reader);
  const orientation = readOrientation(entry, body, epochJd, reader);
  if (shape === null || orientation === null || body === null || epochJd === undefined) return null;
  const elements = ofDate({ ...shape, ...orientation }, entry, epochJd);
  if (entry.elementsAre === 'mean') return { ...elements, kind: 'mean' };
  const result = tryMeanFromOsculating(body, elements);
  if (result.ok) return result.mean;
  const message = `These osculating elements do not convert to mean elements: ${result.message}. Expected an orbit clear of the body, or type the elements as mean.`;
  return reader.fail(shapeField(entry.form), message);
}

function ofDate(elements: KeplerianElements, entry: OrbitEntry, epochJd: number | null): KeplerianElements {
  const frame = angleFrame(entry);
  if (epochJd === null || frame === 'earthFixed') return elements;
  return elementsToMeanOfDate(elements, frame, epochJd);
}

/** Allowed to look at, and said. */
function notePerigee({ body, mean, origin }: ResolvedOrbit, reader: FieldReader): void {
  const altitudeKm = perigeeAltitudeKm(body, mean);
  if (altitudeKm >= 0) return;
  reader.notice({
    id: 'perigeeBelowSurface',
    severity: 'caution',
    field: shapeField(origin),
    text: apsidesAt(
      `Perigee lies ${(-altitudeKm).toFixed(1)} km below the surface: the numbers are worked out, but nothing can fly there. Raise the perigee.`,
      body,
    ),
  });
}

function shapeField(form: ResolvedOrbit['origin']): FieldId {
  return ({ altitudes: 'perigeeAltitude', elements: 'semiMajorAxis', state: 'x', twoLine: 'twoLine' } as const)[form];
}
