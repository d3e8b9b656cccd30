import { describe, expect, it } from 'vitest';
import { forcesText, type MissionEvent, type MissionOutcome, missionHeadline } from '../../../core/index';

const jdOf = (iso: string) => Date.parse(`${iso}T00:00:00Z`) / 86_400_000 + 2_440_587.5;
const event = (kind: MissionEvent['kind'], iso: string, days: number): MissionEvent => ({
  kind,
  days,
  jd: jdOf(iso),
  words: '',
  value: null,
});

const outcome: MissionOutcome = {
  localTime: { startH: 10.5, endH: 10.15, node: 'descending' },
  nodeChangeRad: 31,
  startInclinationRad: 1.7,
  endInclinationRad: 1.69,
  spanDays: 5 * 365.25,
  boxMinutes: 15,
  events: [],
  endMessage: '',
};
const said = (part: Partial<MissionOutcome>) =>
  missionHeadline({ ...outcome, ...part })
    .map(({ text }) => text)
    .join('');

describe('the sentence about a mission', () => {
  it('says from when to when local time runs, and when it leaves the box', () => {
    expect(said({ events: [event('boxLeft', '2032-03-24', 1500)] })).toBe(
      'Local time of the descending node runs from 10:30 to 10:09 in 5 years; it leaves the ±15 min box on 2032-03-24.',
    );
  });

  it('says when it is back in the box', () => {
    const events = [event('boxLeft', '2030-01-02', 100), event('boxEntered', '2031-05-06', 400)];
    expect(said({ events })).toMatch(/on 2030-01-02 and is back in it on 2031-05-06\.$/);
  });

  it('says that it stays in the box', () => {
    expect(said({ spanDays: 365.25 })).toMatch(/in 1 year; it stays in the ±15 min box\.$/);
  });

  it('says nothing of the box before the events are computed', () => {
    expect(said({ events: null })).toBe('Local time of the descending node runs from 10:30 to 10:09 in 5 years.');
  });

  it('writes seconds where minutes would show no change', () => {
    expect(said({ localTime: { startH: 10.5, endH: 10.51, node: 'ascending' } })).toMatch(/from 10:30:00 to 10:30:36/);
  });

  it('counts turns where local time goes round', () => {
    expect(said({ localTime: { startH: 10, endH: 10 - 24 * 6, node: 'ascending' } })).toBe(
      'Local time of the ascending node goes round backwards 6.0 times in 5 years, once in 304 days.',
    );
  });

  it('speaks of node and inclination where there is no clock', () => {
    expect(said({ localTime: null, spanDays: 30 })).toMatch(/^The node moves \+1776\.2° in 30 days; inclination goes/);
  });

  it('ends with the end of the orbit', () => {
    const end = 'On 2029-03-02 the perigee sinks below 120 km.';
    expect(said({ endMessage: end, spanDays: 426.2 }).endsWith(end)).toBe(true);
  });
});

describe('the forces in words', () => {
  it('are those that acted', () => {
    const drag = { ballisticKgPerM2: 75, density: 'high' } as const;
    const asked = { zonalDegree: 14, sun: true, moon: true, drag };
    expect(forcesText(asked, [])).toBe('zonals to degree 14, Sun, Moon, drag at high density, 75 kg/m²');
    expect(
      forcesText(asked, [
        { force: 'moon', reason: 'none' },
        { force: 'drag', reason: 'none' },
      ]),
    ).toBe('zonals to degree 14, Sun');
    expect(forcesText({ zonalDegree: 2, sun: false, moon: false }, [])).toBe('J2 and its square');
  });
});
