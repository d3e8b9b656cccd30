/** Conditions that cannot both count, found before anything is solved. */
import type { Body } from '../../bodies/body';
import { degPerRad, secondsPerDay } from '../../numerics/angles';
import type { Condition } from '../conditions/condition';
import { nodeRateOfRepeat } from '../conditions/repeat';
import { type NoOrbit, noOrbit } from './answer';
import { type FreeElement, freeElements } from './problem';

const sameShare = 1e-12;
const typedDigits = 6;
const mostMore = 10;

/** The first pair of conditions on one and the same quantity, or of altitudes upside down. */
export function conflictBetween(conditions: readonly Condition[]): NoOrbit | null {
  for (let second = 1; second < conditions.length; second += 1) {
    for (let first = 0; first < second; first += 1) {
      const pair = [conditions[first] as Condition, conditions[second] as Condition] as const;
      const problem = problemOfPair(...pair);
      if (problem) return noOrbit(problem.kind, problem.text, [first, second]);
    }
  }
  return null;
}

interface PairProblem {
  readonly kind: 'conflict' | 'redundant';
  readonly text: string;
}

function problemOfPair(one: Condition, other: Condition): PairProblem | null {
  if (one.family !== other.family) return null;
  if (one.family === 'altitude' && one.kind !== other.kind) return upsideDown(one, other);
  if (one.family === 'period' && one.kind !== other.kind) return null;
  const names = `${one.label} and ${inSentence(other.label)}`;
  if (isSame(one, other)) {
    return { kind: 'redundant', text: `${names} ask for the same ${one.quantity}: one of them is redundant.` };
  }
  return {
    kind: 'conflict',
    text: `${names} conflict: they ask for different values of the ${one.quantity}, ${valuesApart(one, other)}.`,
  };
}

/** A rate is typed with about six digits, one that follows from a year or a track has them all. */
function isSame(one: Condition, other: Condition): boolean {
  const isRate = one.family === 'node' || one.family === 'perigee';
  if (isRate && asTyped(one) === asTyped(other)) return true;
  const size = Math.max(Math.abs(one.target), Math.abs(other.target));
  return Math.abs(one.target - other.target) <= sameShare * size;
}

const asTyped = ({ target }: Condition): string => (target * degPerRad * secondsPerDay).toPrecision(typedDigits);

/** Both targets with as many digits as tell them apart. */
function valuesApart(one: Condition, other: Condition): string {
  let more = 0;
  while (more < mostMore && one.write(one.target, more) === other.write(other.target, more)) more += 1;
  return `${one.write(one.target, more)} against ${other.write(other.target, more)}`;
}

function upsideDown(one: Condition, other: Condition): PairProblem | null {
  const [perigee, apogee] = one.kind === 'perigeeAltitude' ? [one, other] : [other, one];
  if (perigee.target <= apogee.target) return null;
  return {
    kind: 'conflict',
    text: `${perigee.label} and ${inSentence(apogee.label)} conflict: perigee lies above apogee.`,
  };
}

export function inSentence(label: string): string {
  return label.startsWith('Sun') || label === 'Frozen' ? label : label.charAt(0).toLowerCase() + label.slice(1);
}

/** A repeat and a nodal period together fix the nodal day: the repeat counts as the node rate that leaves. */
export function withoutTwoPeriods(conditions: readonly Condition[], body: Body): readonly Condition[] {
  const period = conditions.find(({ kind }) => kind === 'nodalPeriod');
  const closure = conditions.find(({ kind }) => kind === 'repeat');
  if (!period || !closure || body.rotationRadPerS === null) return conditions;
  const implied = nodeRateOfRepeat(closure, period.target, body.rotationRadPerS);
  return conditions.map((condition) => (condition === closure ? implied : condition));
}

const elementNames: Readonly<Record<FreeElement, string>> = {
  semiMajorAxisKm: 'semi-major axis',
  eccentricity: 'eccentricity',
  inclinationRad: 'inclination',
};

export function namesOf(elements: readonly FreeElement[]): string {
  const names = elements.map((element) => elementNames[element]);
  return names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} and ${names.at(-1)}`;
}

/** Numbers of conditions and free elements that do not match, or conditions on what is held. */
export function mismatch(conditions: readonly Condition[], free: readonly FreeElement[]): NoOrbit | null {
  const altitudes = conditions.filter(({ family }) => family === 'altitude');
  const frozen = conditions.find(({ family }) => family === 'frozen');
  const shapeFree = free.filter((element) => element !== 'inclinationRad');
  const places = (wanted: readonly Condition[]) => wanted.map((condition) => conditions.indexOf(condition));
  if (conditions.length > free.length) {
    const counts = `${conditions.length} conditions cannot be met by ${free.length} free ${free.length === 1 ? 'element' : 'elements'}`;
    const held = freeElements.filter((element) => !free.includes(element));
    const advice = held.length > 0 ? `free the ${namesOf(held)}, or drop a condition` : 'drop a condition';
    return noOrbit('tooMany', `${counts} (${namesOf(free)}): ${advice}.`);
  }
  const [first, second] = altitudes;
  if (first && shapeFree.length === 0) {
    return noOrbit(
      'held',
      `${first.label} turns on semi-major axis and eccentricity, and both are held.`,
      places([first]),
    );
  }
  if (frozen && !free.includes('eccentricity')) {
    return noOrbit('held', 'Frozen settles the eccentricity, and that is held: free it.', places([frozen]));
  }
  const settledShape = [...altitudes, ...(frozen ? [frozen] : [])];
  if (first && settledShape.length > shapeFree.length) {
    const others = [second, frozen].flatMap((each) => (each ? [each] : []));
    const names = [first, ...others].map(({ label }, place) => (place === 0 ? label : inSentence(label)));
    const listed = `${names.slice(0, -1).join(', ')} and ${names.at(-1)}`;
    const text = `${listed} conflict: ${others.length > 1 ? 'all three' : 'both'} settle the ${namesOf(shapeFree)}.`;
    return noOrbit('conflict', text, places(settledShape));
  }
  return tooFew(conditions, free);
}

function tooFew(conditions: readonly Condition[], free: readonly FreeElement[]): NoOrbit | null {
  if (conditions.length === free.length) return null;
  const counts = `${conditions.length === 0 ? 'No condition' : conditions.length} for ${free.length} free elements`;
  return noOrbit('tooFew', `${counts} (${namesOf(free)}): add a condition for each, or hold an element.`);
}
