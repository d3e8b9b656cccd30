import { julianDateFromIso, seriesSpan } from '../../bodies/julianDate';
import type { FieldReader } from '../readFields';

/** Null is "none typed and none needed"; undefined is "there is a message at the field". */
export type EpochReading = number | null | undefined;

/**
 * The epoch as a UTC Julian date. `neededFor` says what cannot be worked out without it ("a local
 * time of the node"), or is null where the orbit stands without one.
 */
export function readEpoch(reader: FieldReader, neededFor: string | null): EpochReading {
  const text = reader.text('epoch');
  if (text === '') {
    if (neededFor === null) return null;
    reader.fail('epoch', `Epoch is empty; ${neededFor} needs a date and time in UTC, such as 2027-03-20T10:30:00Z.`);
    return undefined;
  }
  const result = julianDateFromIso(text);
  if (!result.ok) {
    reader.fail('epoch', result.message);
    return undefined;
  }
  noteSpan(reader, result.jd);
  return result.jd;
}

/** Sun and time series are checked over 1950–2100 only. */
export function noteSpan(reader: FieldReader, jd: number, field: 'epoch' | 'twoLine' = 'epoch'): void {
  if (jd >= seriesSpan.firstJd && jd <= seriesSpan.lastJd) return;
  reader.notice({
    id: 'epochOutsideSeries',
    severity: 'caution',
    field,
    text: 'The epoch lies outside 1950–2100, where the series for the Sun and for time were checked: take local times as rough, and check the year.',
  });
}
