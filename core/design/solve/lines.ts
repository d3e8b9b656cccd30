/**
 * The shapes (a, e) that are left once altitudes and held elements have had their say: single ones, or a line of them.
 *
 * Where a and e are both open and no altitude ties them, one condition settles a at each e, and e is the line's measure.
 */
import type { Condition } from '../conditions/condition';
import type { Shape, ShapeRates } from '../shapeRates';
import { shapeAtAxis } from './axis';
import type { ThetaRule } from './inclinations';
import { ceilingKm, floorKm, type Problem, ratesOf } from './problem';

export interface Line {
  readonly grid: Float64Array;
  /** θ matters only where a condition settles a along the line. */
  readonly shapeAt: (s: number, theta: ThetaRule) => ShapeRates | null;
  /** The condition that the line meets by itself, other than altitudes. */
  readonly spent: Condition | null;
}

export type Shapes =
  | { readonly kind: 'single'; readonly shapes: readonly ShapeRates[] }
  | { readonly kind: 'line'; readonly line: Line };

/** Rates are powers of a: few samples of ln a show every turn. */
const axisSamples = 28;
const samples = 40;
const planeSamples = 48;

export interface Sampling {
  /** 1 finds nearly everything, more is for what it missed. */
  readonly density: number;
  /** Lines run down to p = this share of the floor. */
  readonly share: number;
}

export function shapesLeft(problem: Problem, sampling: Sampling): Shapes {
  const { start, free, conditions } = problem;
  const axisFree = free.includes('semiMajorAxisKm');
  const eccentricityFree = free.includes('eccentricity');
  const [first, second] = conditions.filter(({ family }) => family === 'altitude');
  if (!axisFree && !eccentricityFree) return single(problem, start);
  if (first && second) return single(problem, betweenApsides(first, second));
  if (first && axisFree && eccentricityFree) return { kind: 'line', line: altitudeLine(problem, first, sampling) };
  if (first) return single(problem, tiedByAltitude(problem, first, axisFree));
  if (axisFree && eccentricityFree) return { kind: 'line', line: planeLine(problem, sampling) };
  return { kind: 'line', line: axisFree ? axisLine(problem, sampling) : eccentricityLine(problem, sampling) };
}

function single(problem: Problem, shape: Shape): Shapes {
  const rates = ratesOf(problem, shape);
  return { kind: 'single', shapes: rates ? [rates] : [] };
}

/** a(1 − e) and a(1 + e) are known: their sum is 2a. */
function betweenApsides(first: Condition, second: Condition): Shape {
  const [low, high] = first.kind === 'perigeeAltitude' ? [first, second] : [second, first];
  const perigeeKm = needed(low.axisKmAt)(0);
  const apogeeKm = needed(high.axisKmAt)(0);
  return {
    semiMajorAxisKm: (perigeeKm + apogeeKm) / 2,
    eccentricity: unrounded((apogeeKm - perigeeKm) / (apogeeKm + perigeeKm)),
  };
}

function tiedByAltitude({ start }: Problem, altitude: Condition, axisFree: boolean): Shape {
  if (axisFree) {
    return { semiMajorAxisKm: needed(altitude.axisKmAt)(start.eccentricity), eccentricity: start.eccentricity };
  }
  const eccentricity = unrounded(needed(altitude.eccentricityAt)(start.semiMajorAxisKm));
  return { semiMajorAxisKm: start.semiMajorAxisKm, eccentricity };
}

/** A circle whose e came out a rounding below 0. */
function unrounded(eccentricity: number): number {
  return eccentricity < 0 && eccentricity > -1e-13 ? 0 : eccentricity;
}

function needed<T>(hint: T | undefined): T {
  if (hint === undefined) throw new Error('an altitude has to give its a and e, got neither');
  return hint;
}

function evenGrid(low: number, high: number, count: number): Float64Array {
  const grid = new Float64Array(count + 1);
  for (let k = 0; k <= count; k += 1) grid[k] = low + ((high - low) * k) / count;
  return grid;
}

const noGrid = new Float64Array(0);

/** e held: even in ln a, as rates are powers of a. */
function axisLine(problem: Problem, { density, share }: Sampling): Line {
  const { eccentricity } = problem.start;
  const low = Math.log((share * floorKm(problem.body)) / ((1 - eccentricity) * (1 + eccentricity)));
  const high = Math.log(ceilingKm(problem.body));
  return {
    grid: low < high ? evenGrid(low, high, density * axisSamples) : noGrid,
    shapeAt: (s) => ratesOf(problem, { semiMajorAxisKm: Math.exp(s), eccentricity }),
    spent: null,
  };
}

/** a held: e up to where p is the search's floor. */
function eccentricityLine(problem: Problem, { density, share }: Sampling): Line {
  const { semiMajorAxisKm } = problem.start;
  const square = 1 - (share * floorKm(problem.body)) / semiMajorAxisKm;
  return {
    grid: square > 0 ? evenGrid(0, Math.sqrt(square), density * samples) : noGrid,
    shapeAt: (s) => ratesOf(problem, { semiMajorAxisKm, eccentricity: s }),
    spent: null,
  };
}

/** Perigee or apogee held. For perigee the line runs over ln a, for apogee over e. */
function altitudeLine(problem: Problem, altitude: Condition, { density, share }: Sampling): Line {
  const floor = share * floorKm(problem.body);
  const radiusKm = needed(altitude.axisKmAt)(0);
  if (altitude.kind === 'apogeeAltitude') {
    const shapeAt = (s: number) => ratesOf(problem, { semiMajorAxisKm: radiusKm / (1 + s), eccentricity: s });
    return {
      grid: radiusKm > floor ? evenGrid(0, 1 - floor / radiusKm, density * samples) : noGrid,
      shapeAt,
      spent: null,
    };
  }
  const low = Math.log(radiusKm);
  const high = Math.log(ceilingKm(problem.body));
  return {
    grid: low < high ? evenGrid(low, high, density * samples) : noGrid,
    shapeAt: (s) => ratesOf(problem, { semiMajorAxisKm: Math.exp(s), eccentricity: -Math.expm1(low - s) }),
    spent: null,
  };
}

/** A period settles a best; without one, the node rate does. */
export function settlingAxis(conditions: readonly Condition[]): Condition | null {
  const of = (wanted: Condition['family']) => conditions.find(({ family }) => family === wanted);
  return of('period') ?? of('node') ?? null;
}

/** a and e both open: e runs, closer together towards 1, and a follows. */
function planeLine(problem: Problem, { density }: Sampling): Line {
  const spent = settlingAxis(problem.conditions);
  if (!spent) return { grid: noGrid, shapeAt: () => null, spent };
  const guess = { km: spent.axisGuessKm ?? 2 * floorKm(problem.body) };
  const grid = evenGrid(0, Math.PI / 2 - 0.02, density * planeSamples).map(Math.sin);
  const shapeAt = (eccentricity: number, theta: ThetaRule) => {
    const shape = shapeAtAxis(problem, { condition: spent, eccentricity, theta, guessKm: guess.km });
    if (shape) guess.km = shape.semiMajorAxisKm;
    return shape;
  };
  return { grid, shapeAt, spent };
}
