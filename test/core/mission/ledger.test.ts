import { describe, expect, it } from 'vitest';
import {
  bodies,
  type HistoryRequest,
  localTimeOfNodeH,
  nodePrecessionRadPerS,
  secularRates,
} from '../../../core/index';
import { effectsLedger } from '../../../core/mission/ledger';
import { missionHistory } from '../../../core/mission/missionHistory';
import { at } from './orbits';

const { earth, mars } = bodies;
const drag = { ballisticKgPerM2: 100, density: 'mean' } as const;
const request: HistoryRequest = {
  body: earth,
  mean: at({ semiMajorAxisKm: 7000, eccentricity: 0.001, inclinationRad: 1.71 }),
  epochJd: 2_461_000.5,
  spanDays: 400,
  sampleDays: 20,
  forces: { zonalDegree: 14, sun: true, moon: true, drag },
};

describe('effects ledger', () => {
  const ledger = effectsLedger(request);
  const last = ledger.history.samples.at(-1)?.mean;

  it('has its rows in order', () => {
    expect(ledger.rows.map(({ effect }) => effect)).toEqual([
      'j2',
      'j2SquareAndJ4',
      'evenZonals',
      'oddZonals',
      'sun',
      'moon',
      'drag',
      'precession',
    ]);
  });

  it('adds up to what the history does', () => {
    expect(ledger.sum.nodeRad).toBeCloseTo((last?.nodeRad ?? Number.NaN) - request.mean.nodeRad, 11);
    expect(ledger.sum.inclinationRad).toBeCloseTo((last?.inclinationRad ?? 0) - request.mean.inclinationRad, 12);
    expect(ledger.sum.eccentricity).toBeCloseTo((last?.eccentricity ?? 0) - request.mean.eccentricity, 12);
    expect(ledger.sum.altitudeKm).toBeCloseTo((last?.semiMajorAxisKm ?? 0) - request.mean.semiMajorAxisKm, 9);
  });

  it('adds up to the drift of local time', () => {
    const options = { node: 'ascending', sun: 'mean' } as const;
    const node = (last?.nodeRad ?? 0) + nodePrecessionRadPerS * 400 * 86_400;
    const from = localTimeOfNodeH(request.mean.nodeRad, request.epochJd, options);
    const drift = localTimeOfNodeH(node, request.epochJd + 400, options) - from;
    const hours = (ledger.sum.localTimeS ?? Number.NaN) / 3600;
    expect(Math.abs(hours - drift - 24 * Math.round((hours - drift) / 24))).toBeLessThan(1e-9);
  });

  it('begins with what J2 alone does, and J2² with J4 comes next, as the closed form has it', () => {
    const seconds = 400 * 86_400;
    const first = secularRates(earth, request.mean, 'first').nodeRadPerS * seconds;
    const second = secularRates(earth, request.mean, 'second').nodeRadPerS * seconds;
    expect(ledger.rows[0]?.change.nodeRad).toBeCloseTo(first, 9);
    // Long-period terms and J2 times J4 come on top.
    expect(Math.abs((ledger.rows[1]?.change.nodeRad ?? 0) - (second - first))).toBeLessThan(2e-4);
  });

  it('lets drag alone lower the orbit, and says that the perigee of a near-circle is vague', () => {
    for (const { effect, change } of ledger.rows) {
      if (effect === 'drag') expect(change.altitudeKm).toBeLessThan(-0.1);
      else expect(Math.abs(change.altitudeKm)).toBeLessThan(1e-6);
    }
    expect(ledger.perigeeIsVague).toBe(true);
  });

  it('bounds what is left out, each with its basis', () => {
    expect(ledger.bounds.map(({ effect }) => effect)).toEqual(['tesserals', 'tides', 'radiation', 'method', 'density']);
    for (const bound of ledger.bounds) {
      expect(bound.source.length).toBeGreaterThan(20);
      for (const size of [bound.nodeRad, bound.inclinationRad, bound.eccentricity]) {
        expect(size).toBeGreaterThanOrEqual(0);
        expect(size).toBeLessThan(0.05);
      }
    }
  });

  it('has rows for what is on and can be had', () => {
    const bare = effectsLedger({ ...request, forces: { zonalDegree: 2, sun: false, moon: true } });
    expect(bare.rows.map(({ effect }) => effect)).toEqual(['j2', 'j2SquareAndJ4', 'moon', 'precession']);
    const away = effectsLedger({ ...request, body: mars, mean: at({ semiMajorAxisKm: 3900 }) });
    expect(away.rows.map(({ effect }) => effect)).toEqual(['j2', 'j2SquareAndJ4', 'oddZonals']);
    expect(away.bounds).toEqual([]);
    expect(away.sum.localTimeS).not.toBeNull();
  });

  it('belongs to the end of the orbit where that comes first', () => {
    const falling = { ...request, mean: at({ semiMajorAxisKm: 6680, eccentricity: 0.001 }) };
    const history = missionHistory(falling);
    const short = effectsLedger(falling, { history });
    expect(history.endedBy).toBe('decay');
    expect(short.endDays).toBe(history.endDays);
    expect(short.sum.altitudeKm).toBeLessThan(-100);
  });
});
