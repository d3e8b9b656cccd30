import { describe, expect, it } from 'vitest';
import { closedFormDrift, gravitySets } from '../../../core/index';
import { angleUnit, changeCaption, changesOf, localTimeUnit, numbersAt } from '../../../web/drift/changes';
import { differenceCaption, differenceOf } from '../../../web/drift/difference';
import { driftPlots } from '../../../web/drift/plotModels';

const rad = Math.PI / 180;
const mean = {
  kind: 'mean',
  semiMajorAxisKm: 6946,
  eccentricity: 0.001,
  inclinationRad: 97.66 * rad,
  nodeRad: 0,
  perigeeRad: 0,
  meanAnomalyRad: 0,
} as const;
const drift = closedFormDrift({ body: gravitySets.EGM2008, mean, spanDays: 1826.25, samples: 241 });

describe('units', () => {
  it('count angles in degrees up to ten turns', () => {
    expect(angleUnit(3600 * rad).name).toBe('degrees');
    expect(angleUnit(3601 * rad).name).toBe('turns');
  });

  it('count local time in minutes, hours, then days', () => {
    expect(localTimeUnit(5 * 3600).name).toBe('minutes');
    expect(localTimeUnit(6 * 3600).name).toBe('hours');
    expect(localTimeUnit(5 * 86_400).name).toBe('days of 24 h');
  });
});

describe('changes from the start', () => {
  const changes = changesOf(drift, 'perigee');

  it('come as local time, node, perigee', () => {
    expect(changes.map(({ title }) => title)).toEqual(['Local time', 'Node', 'Perigee']);
  });

  it('leave local time out where the body has no year', () => {
    const body = { ...gravitySets.EGM2008, yearDays: null };
    const without = closedFormDrift({ body, mean, spanDays: 30, samples: 5 });
    expect(changesOf(without, 'periapsis').map(({ title }) => title)).toEqual(['Node', 'Periapsis']);
  });

  it('are nothing at the start, without a sign', () => {
    for (const change of changes) expect(numbersAt(change, 0).second).toMatch(/^0\.0+$/);
  });

  it('show the difference of the orders to three figures', () => {
    const node = changes[1];
    if (!node) throw new Error('expected a node');
    expect(numbersAt(node, 240).difference.replace(/\D/g, '').replace(/^0+/, '').length).toBe(3);
  });

  it('say at the end of the span what both orders say', () => {
    const node = changes[1];
    if (!node) throw new Error('expected a node');
    expect(changeCaption(node, '5 years')).toMatch(
      /^Rates of now held 5 years: \+1[78]\d\d\.\d\d° second order, \+1[78]\d\d\.\d\d° first; \d\.\d\d° apart\.$/,
    );
  });
});

describe('the difference of the orders', () => {
  it('is second minus first, and told in local time too', () => {
    const difference = differenceOf(drift, 'perigee');
    expect(difference.node[240]).toBeCloseTo(
      ((drift.second.nodeRad[240] ?? 0) - (drift.first.nodeRad[240] ?? 0)) / rad,
      9,
    );
    expect(differenceCaption(drift, difference, '5 years')).toMatch(
      /^Rates of now held 5 years: node \u2212\d\.\d\d°, perigee [+\u2212][\d.]+°, local time \u2212[\d.]+\u202fmin\.$/,
    );
  });
});

describe('the stack of plots', () => {
  const inputs = { drift, time: { epochJd: null, spanDays: 1826.25 }, spanText: '5 years', apsis: 'perigee' };

  it('writes the time only under the last', () => {
    const plots = driftPlots({ ...inputs, isRound: false });
    expect(plots.map(({ model }) => model.hasXLabels)).toEqual([false, false, false, true]);
  });

  it('draws perigee pale and says why on an orbit too round for it', () => {
    const perigee = driftPlots({ ...inputs, isRound: true }).find(({ id }) => id === 'perigee');
    expect(perigee?.title).toContain('means little');
    expect(perigee?.model.lines.every(({ weak }) => weak)).toBe(true);
  });

  it('dots the first order and dashes the second in each', () => {
    const [localTime] = driftPlots({ ...inputs, isRound: false });
    expect(localTime?.model.lines.map(({ id, pattern }) => [id, pattern])).toEqual([
      ['first', 'first'],
      ['second', 'second'],
    ]);
  });
});
