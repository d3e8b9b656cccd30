import { describe, expect, it } from 'vitest';
import { bodies, degPerRad, julianDateFromIso, radPerDeg, steadyMean } from '../../../core/index';
import { createMissionCalls, type MissionRequest } from '../../../web/work/missionCalls';
import { secondLook } from '../../../web/work/secondLook';

const epoch = julianDateFromIso('2028-01-01');
const epochJd = epoch.ok ? epoch.jd : Number.NaN;
const mean = {
  semiMajorAxisKm: 6946.137,
  eccentricity: 0.001,
  inclinationRad: 97.68 * radPerDeg,
  nodeRad: 1,
  perigeeRad: 1.5,
  meanAnomalyRad: 0,
};
const request: MissionRequest = {
  body: bodies.earth,
  mean,
  epochJd,
  spanDays: 365.25,
  forces: { zonalDegree: 14, sun: true, moon: true },
  stretches: 40,
  isAverage: true,
  node: 'descending',
  boxMinutes: 1,
};
const quiet = () => undefined;

describe('a mission in stages', () => {
  it('starts from the a that the orbit keeps where the elements came from a state, and as given where they are a design', () => {
    const startOf = (isAverage: boolean) => {
      const { columns } = createMissionCalls().history({ ...request, spanDays: 1, stretches: 2, isAverage }, quiet);
      return columns.semiMajorAxisKm[0] ?? Number.NaN;
    };
    expect(startOf(true)).toBe(mean.semiMajorAxisKm);
    expect(startOf(false)).toBeCloseTo(steadyMean(bodies.earth, mean, 14).semiMajorAxisKm, 9);
    expect(Math.abs(startOf(false) - mean.semiMajorAxisKm)).toBeGreaterThan(1e-4);
  });

  it('has columns evenly spaced over the span, finer samples behind them, and light at the same moments', () => {
    const calls = createMissionCalls();
    const shares: number[] = [];
    const history = calls.history(request, (share) => shares.push(share));
    const { days } = history.columns;
    expect(days.length).toBe(41);
    days.forEach((day, k) => {
      expect(day).toBeCloseTo((365.25 * k) / 40, 6);
    });
    expect(history.localTimeH?.length).toBe(41);
    expect(shares.every((share) => share >= 0 && share <= 1)).toBe(true);
    const { light, events } = calls.sky();
    expect(light.ok && light.betaRad.length).toBe(41);
    expect(events.events.some(({ kind }) => kind === 'boxLeft')).toBe(true);
    const ledger = calls.ledger(quiet);
    const nodeRad = (history.columns.nodeRad.at(-1) ?? 0) - (history.columns.nodeRad[0] ?? 0);
    expect(ledger.sum.nodeRad).toBeCloseTo(nodeRad, 9);
    expect(ledger.dragSpread).toBeNull();
  });

  it('samples an orbit that decays up to its end', () => {
    const calls = createMissionCalls();
    const drag = { ballisticKgPerM2: 40, density: 'mean' } as const;
    const low = { ...mean, semiMajorAxisKm: 6658 };
    const history = calls.history({ ...request, mean: low, forces: { ...request.forces, drag } }, quiet);
    expect(history.endedBy).toBe('decay');
    expect(history.columns.days.length).toBe(41);
    expect(history.columns.days.at(-1)).toBeCloseTo(history.endDays, 3);
    expect(calls.sky().events.events.at(-1)?.kind).toBe('decay');
    const { dragSpread } = calls.ledger(quiet);
    expect(dragSpread?.high.endJd).toBeLessThan(history.endJd);
    expect(dragSpread?.low.endJd).toBeGreaterThan(history.endJd);
  });

  it('names what another body cannot have', () => {
    const calls = createMissionCalls();
    const history = calls.history({ ...request, body: bodies.mars, mean: { ...mean, semiMajorAxisKm: 3796 } }, quiet);
    expect(history.localTimeH).toBeNull();
    expect(history.localTimeReason).toMatch(/Mars/);
    expect(history.leftOut.map(({ force }) => force)).toEqual(expect.arrayContaining(['sun', 'moon']));
  });

  it('refuses what builds on a history before there is one', () => {
    expect(() => createMissionCalls().sky()).toThrow(/history/);
  });
});

describe('the second look', () => {
  it('meets the averaged node within thousandths of a degree after ten days', () => {
    const { stretches: _stretches, boxMinutes: _box, ...rest } = request;
    const look = secondLook({ ...rest, spanDays: 10 }, quiet);
    expect(look.integrated.days.at(-1)).toBeCloseTo(10, 6);
    const moved = (values: Float64Array) => ((values.at(-1) ?? 0) - (values[0] ?? 0)) * degPerRad;
    expect(Math.abs(moved(look.integrated.nodeRad) - moved(look.averaged.nodeRad))).toBeLessThan(0.002);
    expect(look.localTimeH?.length).toBe(look.integrated.days.length);
  });
});
