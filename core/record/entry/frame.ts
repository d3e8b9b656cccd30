import type { InputFrame, OrbitEntry } from '../candidate';
import type { FieldReader } from '../readFields';

/** The frame the typed angles count in: a local time gives the node of date, so it overrides the tag. */
export function angleFrame(entry: OrbitEntry): InputFrame {
  return entry.nodeForm === 'raan' ? entry.frame : 'meanOfDate';
}

/** What the epoch is needed for, in words that fit "… needs a date and time", or null. */
export function epochNeed(entry: OrbitEntry): string | null {
  if (entry.form === 'twoLine') return null;
  if (entry.form !== 'state' && entry.nodeForm !== 'raan') return 'a local time of the node';
  if (entry.frame === 'earthFixed' && entry.form === 'state') return 'a state in Earth-fixed axes';
  if (entry.frame === 'j2000') return 'an orbit given in J2000';
  return null;
}

/** Frames that the body or the form does not have get a message; false if so. */
export function checkFrame(entry: OrbitEntry, bodyIsEarth: boolean, reader: FieldReader): boolean {
  if (entry.form === 'twoLine') return true;
  const field = entry.form === 'state' ? 'x' : 'node';
  const frame = entry.form === 'state' ? entry.frame : angleFrame(entry);
  if (!bodyIsEarth && frame !== 'meanOfDate') {
    reader.fail(field, `${frameNames[frame]} is a frame of the Earth; at another body choose the equator of date.`);
    return false;
  }
  if (frame === 'earthFixed' && entry.form !== 'state') {
    reader.fail(field, 'Earth-fixed axes serve state vectors only; choose mean of date, J2000 or TEME for elements.');
    return false;
  }
  return true;
}

const frameNames: Readonly<Record<InputFrame, string>> = {
  meanOfDate: 'Mean of date',
  j2000: 'J2000',
  teme: 'TEME',
  earthFixed: 'Earth-fixed',
};

/** What was assumed about the frame and is worth saying. */
export function noteFrame(entry: OrbitEntry, reader: FieldReader): void {
  if (entry.form === 'twoLine' || entry.frame === 'teme') {
    const text = 'TEME is taken as the mean equator and equinox of date; nutation, at most 0.005°, is left out.';
    reader.notice({ id: 'temeAsMeanOfDate', severity: 'note', text });
  } else if (entry.form !== 'state' && entry.frame === 'j2000' && entry.nodeForm !== 'raan') {
    const text = 'A local time gives the node of date, so the other angles are taken as of date too, not as J2000.';
    reader.notice({ id: 'localTimeOfDate', severity: 'note', field: 'node', text });
  }
}
