import { twoline2satrec } from 'satellite.js';
import { describe, expect, it } from 'vitest';
import { parseTle, type TwoLineElements } from '../../core/index';
import { twoLineSets } from './twoLineSets';

/**
 * Two-line elements against satellite.js 7.1.0, which reads columns with its own code and removes
 * Kozai's J2 term in its SGP4 initialisation (WGS 72).
 *
 * Both read the same decimal digits and use the same published formulas, so that only rounding is
 * left; the epoch is compared to the resolution of a Julian date. [Measured worst case.]
 */
const tolerances = {
  // The same digits times the same factor [0].
  angleRad: 1e-14,
  eccentricity: 1e-16,
  // Relative. The same series in J2, in another order of operations [4e-16].
  meanMotion: 1e-13,
  semiMajorAxis: 1e-13,
  // One Julian date in one double: 0.04 ms [0].
  epochDays: 1e-9,
} as const;

const sets = twoLineSets(300);

function parsed(text: string): TwoLineElements {
  const result = parseTle(text);
  if (!result.ok) throw new Error(result.errors.map(({ message }) => message).join('\n'));
  return result;
}

const cases = sets.map((set) => ({
  set,
  ours: parsed(`${set.line1}\n${set.line2}`),
  theirs: twoline2satrec(set.line1, set.line2),
}));

type Case = (typeof cases)[number];
const worst = (gap: (one: Case) => number) => Math.max(...cases.map((one) => Math.abs(gap(one))));
const turnGap = (a: number, b: number) => Math.atan2(Math.sin(a - b), Math.cos(a - b));

describe('two-line elements against satellite.js', () => {
  it('covers at least 200 sets, from low orbits to eccentricity 0.7, forwards and backwards', () => {
    expect(cases.length).toBeGreaterThanOrEqual(200);
    expect(new Set(sets.map(({ family }) => family)).size).toBe(6);
    expect(Math.max(...sets.map(({ eccentricity }) => eccentricity))).toBeGreaterThan(0.69);
    expect(Math.max(...sets.map(({ inclinationDeg }) => inclinationDeg))).toBeGreaterThan(150);
    expect(cases.every(({ theirs }) => theirs.error === 0)).toBe(true);
  });

  it('reads the same angles and eccentricity', () => {
    expect(worst(({ ours, theirs }) => ours.elements.inclinationRad - theirs.inclo)).toBeLessThan(tolerances.angleRad);
    expect(worst(({ ours, theirs }) => turnGap(ours.elements.nodeRad, theirs.nodeo))).toBeLessThan(tolerances.angleRad);
    expect(worst(({ ours, theirs }) => turnGap(ours.elements.perigeeRad, theirs.argpo))).toBeLessThan(
      tolerances.angleRad,
    );
    expect(worst(({ ours, theirs }) => turnGap(ours.elements.meanAnomalyRad, theirs.mo))).toBeLessThan(
      tolerances.angleRad,
    );
    expect(worst(({ ours, theirs }) => ours.elements.eccentricity - theirs.ecco)).toBeLessThan(tolerances.eccentricity);
  });

  it('turns Kozai’s mean motion into the same Brouwer mean motion and semi-major axis', () => {
    const meanMotion = ({ ours }: Case) => Math.sqrt(398600.8 / ours.elements.semiMajorAxisKm ** 3) * 60;
    expect(worst((one) => meanMotion(one) / one.theirs.no - 1)).toBeLessThan(tolerances.meanMotion);
    expect(worst(({ ours, theirs }) => ours.elements.semiMajorAxisKm / (theirs.a * 6378.135) - 1)).toBeLessThan(
      tolerances.semiMajorAxis,
    );
  });

  it('reads the same epoch and drag term', () => {
    expect(worst(({ ours, theirs }) => ours.epochJd - theirs.jdsatepoch)).toBeLessThan(tolerances.epochDays);
    expect(worst(({ ours, theirs }) => ours.bstar - theirs.bstar)).toBeLessThan(1e-17);
  });

  it('makes a difference: Kozai’s mean motion taken for Brouwer’s would miss by kilometres in low orbit', () => {
    const low = cases.filter(({ set }) => set.family === 'sunSynchronous');
    const missKm = low.map(({ ours }) =>
      Math.abs(Math.cbrt(398600.8 / (ours.meanMotionKozaiRadPerMin / 60) ** 2) - ours.elements.semiMajorAxisKm),
    );
    expect(Math.min(...missKm)).toBeGreaterThan(1);
  });
});
