/** How the trade names a body in a sentence, and the ends of an orbit around it. */
import type { Body } from '../bodies/body';

type Named = Pick<Body, 'id' | 'name'>;

/** Within a sentence: the Earth, the Moon, Mars. */
export function inSentence({ id, name }: Named): string {
  return id === 'earth' || id === 'moon' ? `the ${name}` : name;
}

/** What the point nearest to the body is called. */
export const apsisName = (body: Pick<Body, 'id'>): string => (body.id === 'earth' ? 'perigee' : 'periapsis');

/** Words about an orbit of the Earth, for one of another body: periapsis and apoapsis. */
export function apsidesAt(text: string, body: Pick<Body, 'id'> | null): string {
  if (body === null || body.id === 'earth') return text;
  return text
    .replace(/erigee/g, 'eriapsis')
    .replace(/pogee/g, 'poapsis')
    .replace(/\b([Aa])n periapsis/g, '$1 periapsis');
}
