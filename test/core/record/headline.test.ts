import { describe, expect, it } from 'vitest';
import type { FieldId } from '../../../core/record/candidate';
import { headlineOf } from '../../../core/record/headline';
import { readingsOf } from '../../../core/record/readings/readings';
import { resolved } from './candidates';

function sentence(texts: Partial<Record<FieldId, string>>, change: Parameters<typeof resolved>[1] = {}): string {
  const orbit = resolved(texts, change);
  return headlineOf(orbit, readingsOf(orbit))
    .map(({ text }) => text)
    .join('');
}
const ellipse = { perigeeAltitude: '280', apogeeAltitude: '600' };

describe('the headline', () => {
  it('calls an orbit that follows the Sun Sun-synchronous now, with its drift', () => {
    const text = sentence(
      { semiMajorAxis: '7195.605347', eccentricity: '0.001165', inclination: '98.702198' },
      { form: 'elements' },
    );
    expect(text).toMatch(
      /^Sun-synchronous now: the node moves \+0\.985\d deg\/day, its local time [+−]?0\.\d ± 0\.3 min a year at this rate\./,
    );
    expect(text).toContain('At e 0.0012 perigee drift means little');
  });

  it('calls one that nearly does nearly so', () => {
    expect(sentence({ inclination: '97.63', perigeeAltitude: '550', apogeeAltitude: '550' })).toMatch(
      /^Nearly Sun-synchronous now/,
    );
  });

  it('says how fast node and perigee go round elsewhere', () => {
    expect(sentence({ ...ellipse, inclination: '51.6' })).toMatch(
      /^The node regresses now, −4\.\d{4} deg\/day: once round in \d\d\.\d days\. Perigee moves \+3\.\d{4} deg\/day now: once round in \d+(\.\d)? days\.$/,
    );
  });

  it('says advances for a retrograde plane, and stands still for a polar one', () => {
    expect(sentence({ ...ellipse, inclination: '130' })).toContain('The node advances now, +');
    expect(sentence({ ...ellipse, inclination: '90' })).toMatch(/^The node stands still now\./);
  });

  it('speaks of periapsis elsewhere, and makes no claim about years ahead', () => {
    const text = sentence({ perigeeAltitude: '300', apogeeAltitude: '900', inclination: '60' }, { body: 'mars' });
    expect(text).toContain('Periapsis moves');
    expect(text).not.toMatch(/will|years? from|until/);
  });

  it('does not claim more than the doubt allows', () => {
    const mars = { perigeeAltitude: '300', apogeeAltitude: '300', inclination: '92.65' };
    const drift = (inclination: string) =>
      readingsOf(resolved({ ...mars, inclination }, { body: 'mars' })).find(({ id }) => id === 'localTimeDrift')
        ?.value ?? 0;
    let [low, high] = [91, 95];
    for (let step = 0; step < 40; step++) {
      const middle = (low + high) / 2;
      if (drift(String(middle)) < 0) low = middle;
      else high = middle;
    }
    expect(sentence({ ...mars, inclination: String(low) }, { body: 'mars' })).toMatch(
      /^Sun-synchronous by the closed form, give or take \d+(\.\d)? min a year: the node moves/,
    );
  });

  it('agrees with the notice about perigee at small e', () => {
    const at = (e: string) =>
      sentence({ semiMajorAxis: '7200', eccentricity: e, inclination: '51.6' }, { form: 'elements' });
    expect(at('0.002')).toContain('perigee drift means little');
    expect(at('0.01')).toMatch(/Perigee moves \+\S+ deg\/day now, off by up to 12 % at this e: once round in/);
    expect(at('0.03')).not.toContain('off by');
  });

  it('says what a far orbit is moved by, and that an equatorial one has no node', () => {
    const far = sentence({ semiMajorAxis: '1e6', eccentricity: '0.1', inclination: '20' }, { form: 'elements' });
    expect(far).toMatch(/^Sun and Moon move this orbit more than J2 does: of the node J2 makes −\d\.\de?/);
    expect(far).not.toContain('stands still');
    expect(sentence({ ...ellipse, inclination: '0' })).toMatch(
      /^No node in the plane of the equator: perigee is counted against the stars\. Perigee moves \+/,
    );
  });

  it('counts a short turn in hours and minutes', () => {
    expect(
      sentence({ semiMajorAxis: '70000', eccentricity: '0.9999', inclination: '20' }, { form: 'elements' }),
    ).not.toMatch(/\b0\.0 days/);
    const deep = sentence({ semiMajorAxis: '30000', eccentricity: '0.999', inclination: '20' }, { form: 'elements' });
    expect(deep).toMatch(/once round in \d[\d.]* (minutes|hours)/);
  });

  it('marks what is node and what is perigee', () => {
    const orbit = resolved({ ...ellipse, inclination: '51.6' });
    const marks = headlineOf(orbit, readingsOf(orbit)).flatMap(({ mark }) => mark ?? []);
    expect(marks).toEqual(['node', 'perigee']);
  });

  it('takes the unit of rates that the screen shows', () => {
    const orbit = resolved({ ...ellipse, inclination: '51.6' });
    const spans = headlineOf(orbit, readingsOf(orbit), { rateUnit: 'deg/yr' });
    expect(spans.map(({ text }) => text).join('')).toContain('deg/yr');
  });
});
