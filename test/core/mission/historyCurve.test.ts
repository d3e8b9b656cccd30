import { describe, expect, it } from 'vitest';
import { bodies, historyCurve, localTimeHistory, localTimeOfNodeH, nodePrecessionRadPerS } from '../../../core/index';
import { at } from './orbits';

const { earth, mars } = bodies;

/** Perigee goes round once in 100 days, node back 5° a day, a sinks ever faster. */
function meanAt(days: number) {
  return at({
    semiMajorAxisKm: 7000 - 0.001 * days * days,
    eccentricity: 0.01,
    inclinationRad: 1 + 1e-5 * days,
    nodeRad: 6 - 0.087 * days,
    perigeeRad: 0.2 + (2 * Math.PI * days) / 100,
  });
}

const samples = [0, 5, 10, 12, 20, 30, 33].map((days) => ({ days, mean: meanAt(days) }));

describe('the curve through a history', () => {
  it('gives back the samples, and what lies between where elements go at even paces', () => {
    const curve = historyCurve(samples);
    for (const days of [0, 0.3, 5, 7.7, 11, 12, 15, 29, 31, 33, 2, 30]) {
      const [found, truth] = [curve(days), meanAt(days)];
      for (const key of ['semiMajorAxisKm', 'eccentricity', 'inclinationRad', 'nodeRad', 'perigeeRad'] as const) {
        expect(found[key]).toBeCloseTo(truth[key], 9);
      }
    }
  });

  it('carries an eccentricity vector through zero', () => {
    // e cos ω = 1e-3 (days − 4), e sin ω = 0: perigee jumps by half a turn on day 4.
    const through = [0, 2, 6, 8, 10].map((days) => ({
      days,
      mean: at({ eccentricity: Math.abs(1e-3 * (days - 4)), perigeeRad: days < 4 ? Math.PI : 2 * Math.PI }),
    }));
    const curve = historyCurve(through);
    for (const days of [1, 3, 5, 7]) {
      const { eccentricity, perigeeRad } = curve(days);
      if (days < 2 || days > 6) {
        expect(eccentricity * Math.cos(perigeeRad)).toBeCloseTo(1e-3 * (days - 4), 5);
      }
      expect(eccentricity).toBeLessThan(5e-3);
    }
  });

  it('goes through as many samples as there are', () => {
    expect(historyCurve(samples.slice(0, 1))(3)).toMatchObject({ semiMajorAxisKm: 7000 });
    expect(historyCurve(samples.slice(0, 2))(2.5).inclinationRad).toBeCloseTo(1 + 2.5e-5, 12);
  });

  it('refuses samples that are none, or that do not follow each other', () => {
    expect(() => historyCurve([])).toThrow(/at least one/);
    expect(() => historyCurve([...samples].reverse())).toThrow(/follow each other/);
  });
});

describe('local time over a history', () => {
  const epochJd = 2_461_041.5;

  it('is that of the node of the date, on every turn', () => {
    const request = { body: earth, epochJd, node: 'descending', sun: 'mean' } as const;
    const far = [0, 40, 80, 4000].map((days) => ({ days, mean: meanAt(days) }));
    const history = localTimeHistory({ ...request, samples: far });
    if (!history.ok) throw new Error(history.message);
    history.points.forEach(({ days, hours }) => {
      const node = meanAt(days).nodeRad + nodePrecessionRadPerS * 86_400 * days;
      const clock = localTimeOfNodeH(node, epochJd + days, { node: 'descending', sun: 'mean' });
      expect(hours - 24 * Math.floor(hours / 24)).toBeCloseTo(clock, 6);
    });
    // −5° and −1° a day, 24 h to 360°.
    expect(history.points[2]?.hours).toBeCloseTo(
      (history.points[0]?.hours ?? 0) - 80 * (24 / 360) * (4.985 + 0.9856),
      1,
    );
  });

  it('is told for the Earth only', () => {
    const request = { body: mars, epochJd, node: 'ascending', sun: 'mean' } as const;
    expect(localTimeHistory({ ...request, samples })).toMatchObject({ ok: false, reason: 'earthOnly' });
  });
});
