import { describe, expect, it } from 'vitest';
import { bodies, eclipse, lightHistory, nodeFromLocalTimeRad, sunSeenFrom } from '../../../core/index';
import { at } from './orbits';

const { earth } = bodies;
const epochJd = 2_461_041.5;
const yearRadPerDay = (2 * Math.PI) / 365.2422;

/** A history in which the node keeps its place from the mean Sun: dawn-dusk, in eclipse only about one solstice. */
function dawnDusk(localTimeH: number) {
  const node = nodeFromLocalTimeRad(localTimeH, epochJd, { node: 'ascending', sun: 'mean' });
  const mean = at({ semiMajorAxisKm: 7178, eccentricity: 0.001, inclinationRad: 1.7225 });
  return [0, 100, 200, 300, 365, 400, 500, 600, 700, 730].map((days) => ({
    days,
    mean: { ...mean, nodeRad: node + yearRadPerDay * days },
  }));
}

describe('light over two years of a dawn-dusk orbit', () => {
  const samples = dawnDusk(18);
  const light = lightHistory({ body: earth, epochJd, samples });
  if (!light.ok) throw new Error(light.message);
  const { rows, summary } = light;

  it('has a row a day, equal to the single call in the same frame', () => {
    expect(rows).toHaveLength(731);
    const row = rows[100];
    const sample = samples[1];
    if (!row || !sample) throw new Error('a row was expected');
    expect(row.days).toBe(100);
    const single = eclipse(earth, sample.mean, epochJd + 100, epochJd);
    expect(row.umbraS).toBeCloseTo(single.umbraS, 6);
    expect(row.penumbraS).toBeCloseTo(single.penumbraS, 6);
  });

  it('has one season of eclipses a year, at the same time of the year', () => {
    expect(summary.eclipseSeasons).toHaveLength(2);
    const [first, second] = summary.eclipseSeasons;
    if (!first || !second) throw new Error('two seasons were expected');
    expect(second.fromDays - first.fromDays).toBeCloseTo(365.24, 0);
    expect(second.toDays - first.toDays).toBeCloseTo(365.24, 0);
    // About the June solstice, day 171 of 2026.
    expect(0.5 * (first.fromDays + first.toDays)).toBeGreaterThan(140);
    expect(0.5 * (first.fromDays + first.toDays)).toBeLessThan(200);
  });

  it('sums the seasons to the whole and turns where eclipses do', () => {
    const free = summary.freeSeasons.reduce((sum, { fromDays, toDays }) => sum + toDays - fromDays, 0);
    const dark = summary.eclipseSeasons.reduce((sum, { fromDays, toDays }) => sum + toDays - fromDays, 0);
    expect(free + dark).toBeCloseTo(730, 9);
    expect(summary.freeShare).toBeCloseTo(free / 730, 12);
    expect(summary.firstFreeDays).toBe(0);
    expect(summary.lastFreeDays).toBe(730);
    const begins = summary.eclipseSeasons[0]?.fromDays ?? Number.NaN;
    for (const row of rows) {
      if (row.days < begins) expect(row.umbraS + row.penumbraS).toBe(0);
    }
  });

  it('knows its longest eclipse', () => {
    const most = Math.max(...rows.map(({ umbraS }) => umbraS));
    expect(summary.longest?.umbraS).toBe(most);
    expect(summary.longest?.umbraShare).toBeGreaterThan(0.1);
  });
});

describe('light', () => {
  it('of a single sample is a single row', () => {
    const light = lightHistory({ body: earth, epochJd, samples: dawnDusk(18).slice(0, 1) });
    expect(light.ok && light.rows).toHaveLength(1);
    expect(light.ok && light.summary.freeShare).toBe(1);
  });

  it('of a noon orbit has an eclipse each day', () => {
    const light = lightHistory({ body: earth, epochJd, samples: dawnDusk(12) });
    expect(light.ok && light.summary).toMatchObject({ freeSeasons: [], freeShare: 0, firstFreeDays: null });
  });

  it('is found for each body whose Sun is known, with its source', () => {
    for (const body of Object.values(bodies)) {
      const model = sunSeenFrom(body);
      expect(model.ok && Math.hypot(...model.sunAt(epochJd).direction)).toBeCloseTo(1, 12);
      expect(model.ok && model.source.length).toBeGreaterThan(10);
    }
  });
});
