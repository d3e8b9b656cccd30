import { describe, expect, it } from 'vitest';
import { bodies, customBody, gravitySets, type HistoryRequest, type MeanElements } from '../../../core/index';
import { HistoryRequestError, historyProblems } from '../../../core/mission/historyRequest';
import { missionHistory } from '../../../core/mission/missionHistory';
import { at } from './orbits';

const { earth, mars } = bodies;
const all = { zonalDegree: 14, sun: true, moon: true };

function request(mean: Partial<MeanElements>, more: Partial<HistoryRequest> = {}): HistoryRequest {
  return { body: earth, mean: at(mean), epochJd: 2_461_000.5, spanDays: 100, sampleDays: 10, forces: all, ...more };
}

function lastOf(asked: HistoryRequest, longestStepDays?: number): MeanElements {
  const last = missionHistory(asked, longestStepDays ? { longestStepDays } : {}).samples.at(-1);
  if (!last) throw new Error('a history has samples');
  return last.mean;
}

describe('samples', () => {
  it('lie evenly from the start to the end, which is there even where it does not fit', () => {
    const { samples, endedBy, endDays, endMessage } = missionHistory(request({}, { spanDays: 47.3 }));
    expect(samples.map(({ days }) => days)).toEqual([0, 10, 20, 30, 40, 47.3]);
    expect([endedBy, endDays, endMessage]).toEqual(['span', 47.3, '']);
  });

  it('start with the elements given', () => {
    const asked = request({ nodeRad: 9, perigeeRad: -3 });
    expect(missionHistory(asked).samples[0]?.mean).toBe(asked.mean);
  });

  it('do not depend on how many there are', () => {
    const few = lastOf(request({}, { sampleDays: 100 }));
    const many = missionHistory(request({}, { sampleDays: 0.37 }));
    expect(few.nodeRad).toBeCloseTo(many.samples.at(-1)?.mean.nodeRad ?? Number.NaN, 12);
    for (let k = 1; k < many.samples.length; k += 1) {
      const turn = (many.samples[k]?.mean.nodeRad ?? 0) - (many.samples[k - 1]?.mean.nodeRad ?? 0);
      expect(turn).toBeLessThan(0);
      expect(turn).toBeGreaterThan(-0.06);
    }
  });

  it('go on past whole turns of the node', () => {
    const { nodeRad } = lastOf(request({ inclinationRad: 0.5, nodeRad: 0.1 }, { spanDays: 365 }));
    expect(nodeRad).toBeLessThan(-6 * Math.PI);
  });

  it('report progress to the end', () => {
    const shares: number[] = [];
    missionHistory(request({}, { spanDays: 400 }), { onProgress: (share) => shares.push(share) });
    expect(shares.length).toBeGreaterThan(5);
    expect([...shares].sort((a, b) => a - b)).toEqual(shares);
    expect(shares.at(-1)).toBeLessThanOrEqual(1);
  });
});

describe('steps', () => {
  it.each([
    ['Sun-synchronous', { semiMajorAxisKm: 6900, eccentricity: 0.001, inclinationRad: 1.7 }],
    ['near the equator', { semiMajorAxisKm: 6900, eccentricity: 0.01, inclinationRad: 0.05 }],
    ['ellipse', { semiMajorAxisKm: 26_554, eccentricity: 0.7, inclinationRad: 1.1 }],
  ])('of two days are as good as of half a day: %s', (_, mean) => {
    const asked = request(mean, { spanDays: 366 });
    const [coarse, fine] = [lastOf(asked), lastOf(asked, 0.5)];
    // 1e-4 of a degree.
    expect(Math.abs(coarse.nodeRad - fine.nodeRad)).toBeLessThan(2e-6);
    expect(Math.abs(coarse.inclinationRad - fine.inclinationRad)).toBeLessThan(1e-7);
    expect(Math.abs(coarse.eccentricity - fine.eccentricity)).toBeLessThan(2e-7);
  });

  it.each([0, 1e-9, 0.3, Math.PI / 2, Math.PI - 1e-9, Math.PI])(
    'are regular on a circle at inclination %d',
    (inclinationRad) => {
      const drag = { ballisticKgPerM2: 100, density: 'mean' } as const;
      const mean = lastOf(request({ eccentricity: 0, inclinationRad }, { forces: { ...all, drag } }));
      for (const value of Object.values(mean)) expect(Number.isFinite(value)).toBe(true);
      expect(mean.eccentricity).toBeLessThan(0.01);
      expect(Math.abs(mean.inclinationRad - inclinationRad)).toBeLessThan(0.01);
    },
  );
});

describe('the end', () => {
  const drag = { ballisticKgPerM2: 50, density: 'mean' } as const;

  it('is decay, with a date and the perigee at its floor', () => {
    const low = { semiMajorAxisKm: 6650, eccentricity: 0.001 };
    const history = missionHistory(request(low, { spanDays: 3000, forces: { ...all, drag } }));
    expect(history.endedBy).toBe('decay');
    expect(history.endMessage).toMatch(/^On 20\d\d-\d\d-\d\d the perigee sinks below 120 km\.$/);
    const last = history.samples.at(-1);
    const heightKm = (last?.mean.semiMajorAxisKm ?? 0) * (1 - (last?.mean.eccentricity ?? 0)) - 6378.137;
    expect(heightKm).toBeCloseTo(120, 1);
    expect(history.endJd).toBeCloseTo(2_461_000.5 + history.endDays, 9);
  });

  it('is at once where the perigee lies in the air or below the ground', () => {
    const inAir = missionHistory(request({ semiMajorAxisKm: 6490, eccentricity: 0 }, { forces: { ...all, drag } }));
    expect([inAir.endedBy, inAir.endDays, inAir.samples.length]).toEqual(['decay', 0, 1]);
    const below = missionHistory(request({ semiMajorAxisKm: 7000, eccentricity: 0.2 }));
    expect([below.endedBy, below.endDays]).toEqual(['decay', 0]);
    expect(below.endMessage).toMatch(/meets the surface/);
  });

  it('is decay where the Moon pulls the perigee down', () => {
    const steep = { semiMajorAxisKm: 60_000, eccentricity: 0.885, inclinationRad: 1.2, nodeRad: 1, perigeeRad: 0.8 };
    const history = missionHistory(request(steep, { spanDays: 5000 }));
    expect(history.endedBy).toBe('decay');
    expect(history.endDays).toBeGreaterThan(50);
    expect(history.cautions.map(({ field }) => field)).toEqual(['mean']);
    for (const { mean } of history.samples) expect(mean.eccentricity).toBeLessThan(1);
  });

  it('is escape where the apogee comes near the Moon, at the start or later', () => {
    const far = missionHistory(request({ semiMajorAxisKm: 300_000, eccentricity: 0.3 }));
    expect([far.endedBy, far.endDays, far.samples.length]).toEqual(['escape', 0, 1]);
    const rising = { semiMajorAxisKm: 190_000, eccentricity: 0.25, inclinationRad: 1.4, perigeeRad: 0.8 };
    const later = missionHistory(request(rising, { spanDays: 5000 }));
    expect(later.endedBy).toBe('escape');
    expect(later.endDays).toBeGreaterThan(1);
    expect(later.endMessage).toMatch(/too near the Moon/);
    const last = later.samples.at(-1)?.mean;
    expect((last?.semiMajorAxisKm ?? 0) * (1 + (last?.eccentricity ?? 0))).toBeCloseTo(240_000, 0);
  });

  it('comes in good time even where drag is on and the perigee far above the air', () => {
    const drag2 = { ballisticKgPerM2: 100, density: 'mean' } as const;
    const history = missionHistory(
      request({ semiMajorAxisKm: 150_000, eccentricity: 0.5 }, { spanDays: 5479, forces: { ...all, drag: drag2 } }),
    );
    expect(['span', 'escape']).toContain(history.endedBy);
  });
});

describe('what cannot be had', () => {
  it('is named: bodies without Sun, Moon or air', () => {
    const drag = { ballisticKgPerM2: 50, density: 'mean' } as const;
    const mean = at({ semiMajorAxisKm: 3900 });
    const { leftOut, samples } = missionHistory(request({}, { body: mars, mean, forces: { ...all, drag } }));
    expect(leftOut.map(({ force }) => force)).toEqual(['zonals', 'sun', 'moon', 'drag']);
    expect(leftOut[1]?.reason).toMatch(/Mars/);
    expect(samples.length).toBe(11);
    const own = customBody({ name: 'Own', muKm3PerS2: 1e5, radiusKm: 3000, zonals: [0, 0, 1e-3] });
    expect(missionHistory(request({}, { body: own, forces: all })).leftOut.map(({ force }) => force)).toEqual([
      'zonals',
      'sun',
      'moon',
    ]);
  });

  it('is named: zonals that the gravity set lacks, and nothing where it has them', () => {
    expect(missionHistory(request({}, { body: gravitySets.WGS72 })).leftOut[0]?.reason).toMatch(/degree 4/);
    expect(missionHistory(request({})).leftOut).toEqual([]);
  });
});

describe('bad input', () => {
  const drag = (massKg: number, areaM2 = 1, dragCoefficient = 2.2) =>
    ({ forces: { ...all, drag: { massKg, areaM2, dragCoefficient, density: 'mean' } } }) as const;

  it.each([
    ['spanDays', { spanDays: 0 }],
    ['spanDays', { spanDays: -3 }],
    ['spanDays', { spanDays: 5600 }],
    ['spanDays', { spanDays: Number.NaN }],
    ['sampleDays', { sampleDays: 0 }],
    ['sampleDays', { sampleDays: 1e-9 }],
    ['epochJd', { epochJd: Number.NaN }],
    ['zonalDegree', { forces: { ...all, zonalDegree: 1 } }],
    ['zonalDegree', { forces: { ...all, zonalDegree: 15 } }],
    ['mean', { mean: at({ eccentricity: 1 }) }],
    ['mean', { mean: at({ semiMajorAxisKm: -1 }) }],
    ['mean', { mean: at({ nodeRad: Number.NaN }) }],
    ['drag', drag(0)],
    ['drag', drag(-5)],
    ['drag', drag(100, 0)],
    ['drag', drag(Number.POSITIVE_INFINITY)],
  ])('is told at its field: %s', (field, change) => {
    const asked = request({}, change as Partial<HistoryRequest>);
    expect(historyProblems(asked).map((problem) => problem.field)).toEqual([field]);
    expect(() => missionHistory(asked)).toThrow(HistoryRequestError);
  });

  it('that is only odd is a caution', () => {
    expect(missionHistory(request({}, { epochJd: 2_400_000.5 })).cautions.map(({ field }) => field)).toEqual([
      'epochJd',
    ]);
    expect(
      missionHistory(request({}, drag(1e6) as Partial<HistoryRequest>)).cautions.map(({ field }) => field),
    ).toEqual(['drag']);
    expect(missionHistory(request({})).cautions).toEqual([]);
  });
});
