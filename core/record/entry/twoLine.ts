import type { Body } from '../../bodies/body';
import { gravitySets } from '../../bodies/earth';
import type { MeanElements } from '../../orbit/elements';
import { elementsToMeanOfDate } from '../../orbit/frames';
import type { Candidate } from '../candidate';
import { parseTle } from '../formats/twoLine';
import type { FieldReader } from '../readFields';
import { noteSpan } from './epoch';

export interface TwoLineReading {
  readonly mean: MeanElements;
  readonly epochJd: number;
}

/** Elements and epoch of a two-line set, under the gravity set chosen. */
export function readTwoLine(candidate: Candidate, body: Body | null, reader: FieldReader): TwoLineReading | null {
  if (candidate.body !== 'earth') {
    return reader.fail(
      'twoLine',
      'Two-line elements describe orbits of the Earth; choose the Earth as the body, or another form of entry.',
    );
  }
  const text = reader.text('twoLine');
  if (text === '') {
    return reader.fail(
      'twoLine',
      'No two-line elements yet; paste both lines, 69 characters each, starting with 1 and 2.',
    );
  }
  const result = parseTle(text);
  if (!result.ok) return reader.fail('twoLine', result.errors.map(({ message }) => message).join(' '));
  if (body === null) return null;
  noteSpan(reader, result.epochJd, 'twoLine');
  const { kind: _, ...elements } = elementsToMeanOfDate(result.elements, 'teme', result.epochJd);
  const mean: MeanElements = { ...elements, kind: 'mean' };
  return { mean: underGravitySet(mean, body, reader), epochJd: result.epochJd };
}

/** The mean motion is what was fitted to tracking; under another mu it belongs to another a. */
function underGravitySet(mean: MeanElements, body: Body, reader: FieldReader): MeanElements {
  const made = gravitySets.WGS72;
  if (body.gravitySet === made.gravitySet) return mean;
  const semiMajorAxisKm = mean.semiMajorAxisKm * Math.cbrt(body.muKm3PerS2 / made.muKm3PerS2);
  reader.notice({
    id: 'twoLineGravitySet',
    severity: 'note',
    field: 'twoLine',
    text: `Two-line elements are made with WGS 72. With ${body.gravitySet} the mean motion is kept, which makes a ${semiMajorAxisKm.toFixed(3)} km instead of ${mean.semiMajorAxisKm.toFixed(3)} km; choose WGS 72 to see them as they were made.`,
  });
  return { ...mean, semiMajorAxisKm };
}
