import { describe, expect, it } from 'vitest';
import {
  betaRad,
  bodies,
  customBody,
  type EventKind,
  type EventsRequest,
  localTimeOfNodeH,
  type MeanElements,
  missionEvents,
  nodeFromLocalTimeRad,
  nodePrecessionRadPerS,
} from '../../../core/index';
import { at } from './orbits';

const { earth, mars } = bodies;
const epochJd = 2_461_041.5;
/** The mean Sun's own pace in a frame that does not precess: a node at this pace keeps its local time. */
const sunRadPerDay = (2 * Math.PI) / 365.2422 - nodePrecessionRadPerS * 86_400;
const mean10h30 = at({
  semiMajorAxisKm: 7100,
  eccentricity: 0.002,
  inclinationRad: 1.71,
  nodeRad: nodeFromLocalTimeRad(10.5, epochJd, { node: 'ascending', sun: 'mean' }),
});
const radPerMinute = (2 * Math.PI) / 1440;

function history(spanDays: number, meanAt: (days: number) => Partial<MeanElements>, sampleDays = 5) {
  return Array.from({ length: Math.floor(spanDays / sampleDays) + 1 }, (_, index) => {
    const days = index * sampleDays;
    return { days, mean: { ...mean10h30, nodeRad: mean10h30.nodeRad + sunRadPerDay * days, ...meanAt(days) } };
  });
}

function eventsOf(change: Partial<EventsRequest> & Pick<EventsRequest, 'samples'>) {
  return missionEvents({ body: earth, epochJd, ...change });
}

function daysOf(kind: EventKind, request: Partial<EventsRequest> & Pick<EventsRequest, 'samples'>): readonly number[] {
  return eventsOf(request)
    .events.filter((event) => event.kind === kind)
    .map(({ days }) => days);
}

describe('events of local time', () => {
  // Minutes early or late of the start, as a parabola: +0.02 days − 2e-5 days² … returns at 1000 days.
  const minutes = (days: number) => 0.02 * days - 2e-5 * days * days;
  const samples = history(2000, (days) => ({
    nodeRad: mean10h30.nodeRad + sunRadPerDay * days + minutes(days) * radPerMinute,
  }));

  it('tell when it leaves the box and comes back, and when the node is back', () => {
    const box = { node: 'ascending', allowedMinutes: 4 } as const;
    // 4 = 0.02 t − 2e-5 t² at 276.39 and 723.61; −4 at 1170.82.
    const { events } = eventsOf({ samples, box });
    const daysOfKind = (wanted: EventKind) => events.filter(({ kind }) => kind === wanted).map(({ days }) => days);
    const left = daysOfKind('boxLeft');
    expect(left).toHaveLength(2);
    expect(left[0]).toBeCloseTo(276.39, 0);
    expect(left[1]).toBeCloseTo(1170.82, 0);
    const [entered] = daysOfKind('boxEntered');
    expect(entered).toBeCloseTo(723.61, 0);
    const [back, ...more] = daysOfKind('localTimeBack');
    expect(back).toBeCloseTo(1000, 0);
    expect(more).toEqual([]);
  });

  it('name the side, and the local time of the node that was asked for', () => {
    const box = { node: 'descending', allowedMinutes: 4 } as const;
    const [late, , early] = eventsOf({ samples, box }).events.filter(({ kind }) => kind.startsWith('box'));
    expect(late?.words).toContain('late');
    expect(early?.words).toContain('early');
    expect(late?.value?.amount).toBeCloseTo(22.5 + 4 / 60, 5);
    expect(early?.value?.amount).toBeCloseTo(22.5 - 4 / 60, 5);
  });

  it('hold at the date: the local time found there is the box’s edge', () => {
    const [event] = eventsOf({ samples, box: { node: 'ascending', allowedMinutes: 4 } }).events.filter(
      ({ kind }) => kind === 'boxLeft',
    );
    if (!event) throw new Error('an event was expected');
    const { days, jd } = event;
    const node =
      mean10h30.nodeRad + (sunRadPerDay + nodePrecessionRadPerS * 86_400) * days + minutes(days) * radPerMinute;
    expect(jd).toBe(epochJd + days);
    expect(localTimeOfNodeH(node, jd, { node: 'ascending', sun: 'mean' })).toBeCloseTo(10.5 + 4 / 60, 5);
  });

  it('count from a target, and say so where the start lies outside', () => {
    const box = { node: 'ascending', allowedMinutes: 2, targetH: 10.5 + 5 / 60 } as const;
    const { events } = eventsOf({ samples, box });
    expect(events.find(({ kind }) => kind === 'outsideBox')?.days).toBe(0);
    expect(events.find(({ kind }) => kind === 'boxEntered')?.days).toBeCloseTo(183.77, 0);
  });

  it('come once a turn where the node goes round against the Sun', () => {
    const turning = history(400, (days) => ({
      nodeRad: mean10h30.nodeRad + (sunRadPerDay - (2 * Math.PI) / 60) * days,
    }));
    const back = daysOf('localTimeBack', { samples: turning });
    expect(back).toHaveLength(6);
    back.forEach((days, index) => {
      expect(days).toBeCloseTo(60 * (index + 1), 1);
    });
  });
});

describe('events of perigee', () => {
  it('come in turn as it goes round', () => {
    const samples = history(400, (days) => ({ perigeeRad: 0.1 + (2 * Math.PI * days) / 200 }));
    const found = eventsOf({ samples }).events.filter(({ kind }) => kind.startsWith('perigee'));
    const dayAt = (turns: number) => 200 * (turns - 0.1 / (2 * Math.PI));
    expect(found.map(({ kind }) => kind)).toEqual([
      'perigeeNorth',
      'perigeeEquator',
      'perigeeSouth',
      'perigeeEquator',
      'perigeeNorth',
      'perigeeEquator',
      'perigeeSouth',
      'perigeeEquator',
    ]);
    found.forEach(({ days }, index) => {
      expect(days).toBeCloseTo(dayAt((index + 1) / 4), 6);
    });
    expect(found[1]?.words).toContain('going south');
    expect(found[3]?.words).toContain('going north');
  });

  it('come once for a perigee that swings about its northernmost', () => {
    const samples = history(800, (days) => ({
      perigeeRad: Math.PI / 2 + 0.2 * Math.sin((2 * Math.PI * (days + 3)) / 110),
    }));
    expect(daysOf('perigeeNorth', { samples })).toHaveLength(1);
    expect(daysOf('perigeeEquator', { samples })).toEqual([]);
  });

  it('are none in the equator, and are called by the body’s own word', () => {
    const equator = history(400, (days) => ({ inclinationRad: 0, perigeeRad: days / 20 }));
    expect(eventsOf({ samples: equator }).events.filter(({ kind }) => kind.startsWith('perigee'))).toEqual([]);
    const samples = history(100, (days) => ({ semiMajorAxisKm: 3800, perigeeRad: days / 20 }));
    const found = eventsOf({ body: mars, samples }).events.find(({ kind }) => kind === 'perigeeNorth');
    expect(found?.words).toContain('Periapsis');
  });
});

describe('events of light', () => {
  it('put β’s zeros and extremes where β has them', () => {
    const samples = history(730, (days) => ({ inclinationRad: 0.9, nodeRad: 1 - 0.08 * days }), 2);
    const { events } = eventsOf({ samples });
    const betaAt = (days: number) =>
      betaRad(earth, { ...mean10h30, inclinationRad: 0.9, nodeRad: 1 - 0.08 * days }, epochJd + days, epochJd);
    const zeros = events.filter(({ kind }) => kind === 'betaZero');
    expect(zeros.length).toBeGreaterThan(15);
    for (const { days } of zeros) expect(betaAt(days)).toBeCloseTo(0, 5);
    const extremes = events.filter(({ kind }) => kind === 'betaGreatest' || kind === 'betaLeast');
    expect(extremes.length).toBeGreaterThan(15);
    for (const { days, kind, value } of extremes) {
      const sign = kind === 'betaGreatest' ? 1 : -1;
      expect(value?.amount).toBeCloseTo(betaAt(days), 6);
      expect(sign * betaAt(days)).toBeGreaterThanOrEqual(sign * betaAt(days - 0.5));
      expect(sign * betaAt(days)).toBeGreaterThanOrEqual(sign * betaAt(days + 0.5));
    }
  });

  it('mark where the seasons of eclipse begin and end, but not the ends of the history', () => {
    const node = nodeFromLocalTimeRad(18, epochJd, { node: 'ascending', sun: 'mean' });
    const samples = history(730, (days) => ({ semiMajorAxisKm: 7178, nodeRad: node + sunRadPerDay * days }));
    expect(daysOf('eclipsesBegin', { samples })).toHaveLength(2);
    expect(daysOf('eclipsesEnd', { samples })).toHaveLength(2);
  });
});

describe('events of altitude and the end', () => {
  const samples = history(300, (days) => ({
    semiMajorAxisKm: earth.equatorialRadiusKm + 500 - 0.5 * days,
    eccentricity: 0,
  }));

  it('tell when a limit is undercut, and at once where it is from the start', () => {
    expect(daysOf('altitudeBelow', { samples, altitude: { of: 'mean', km: 420 } })[0]).toBeCloseTo(160, 9);
    expect(daysOf('altitudeBelow', { samples, altitude: { of: 'perigee', km: 420 } })[0]).toBeCloseTo(160, 9);
    expect(daysOf('altitudeBelow', { samples, altitude: { of: 'mean', km: 600 } })).toEqual([0]);
  });

  it('end with the decay, in the order of time', () => {
    const { events } = eventsOf({ samples, altitude: { of: 'mean', km: 420 }, endedBy: 'decay' });
    expect(events.at(-1)).toMatchObject({ kind: 'decay', days: 300 });
    const days = events.map((event) => event.days);
    expect(days).toEqual([...days].sort((a, b) => a - b));
  });
});

describe('events of a body without clock or Sun', () => {
  it('name what is left out and keep the rest', () => {
    const body = customBody({ name: 'Pebble', muKm3PerS2: 1e5, radiusKm: 3000, zonals: [0, 0, 1e-3] });
    const { events, leftOut } = eventsOf({ body, samples: history(300, (days) => ({ perigeeRad: days / 20 })) });
    expect(leftOut.map(({ what }) => what)).toEqual(['localTime', 'light']);
    for (const { reason } of leftOut) expect(reason).toContain('Pebble');
    expect(events.length).toBeGreaterThan(0);
  });
});
